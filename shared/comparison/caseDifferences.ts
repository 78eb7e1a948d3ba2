import { canonical } from '../case/canonical';
import type { CaseFile } from '../case/caseFile';
import type { UnitSystem } from '../units/units';
import { caseFacts, type CaseFact } from './caseFacts';
import type { InputDifference } from './types';

/** The inputs that are not the same in all cases, line by line. Nothing that the results depend on is left out but titles. */
export function caseDifferences(cases: readonly CaseFile[], system: UnitSystem): InputDifference[] {
  const told = cases.map((caseFile) => caseFacts(caseFile, system));
  const lines = new Map<string, (CaseFact | null)[]>();
  const order: string[] = [];
  told.forEach((facts, k) => {
    let before = -1;
    for (const fact of facts) {
      const key = `${fact.part}\n${fact.what}`;
      const line = lines.get(key) ?? cases.map(() => null);
      line[k] = fact;
      // What only a later case has stands where it has it, not at the end.
      if (lines.has(key)) before = order.indexOf(key);
      else order.splice(++before, 0, key);
      lines.set(key, line);
    }
  });
  const inOrder = order.map((key) => lines.get(key)!);
  return inOrder.filter(differs).map((line) => {
    const { part, what } = line.find((fact) => fact !== null)!;
    const texts = line.map((fact) => fact?.text ?? null);
    // Where the words are alike though the values are not, they say so.
    const alike = new Set(texts).size === 1;
    return { part, what, values: alike ? texts.map(marked(line)) : texts };
  });
}

const differs = (line: (CaseFact | null)[]) =>
  new Set(line.map((fact) => (fact ? canonical(fact.exact) : ''))).size > 1;

/** Versions of one text, in the order in which they are met: (a), (b). */
function marked(line: (CaseFact | null)[]) {
  const versions = [...new Set(line.map((fact) => canonical(fact?.exact)))];
  return (text: string | null, k: number) =>
    `${text} (${String.fromCharCode(97 + versions.indexOf(canonical(line[k]?.exact)))})`;
}
