import type { Findings } from './Findings';

interface Series {
  /** Path of the record that holds both columns, e.g. `upstream`. */
  path: string;
  /** Names of the two columns in the record. */
  names: [string, string];
  columns: [number[], number[]];
  /** What the table is, for the sentence that asks for it: `Give the inflow against time.` */
  missing: string;
  /** Words for the first column in a sentence: `Time`. */
  first: string;
  least?: number;
  /** Fault of a single value of the second column, or null. */
  value?: (value: number) => string | null;
}

/** Said of one table at most: a wrong column is one mistake, not a thousand. */
const MOST = 20;

/** A table of two columns: equally long, the first strictly growing, all numbers. True where nothing is wrong. */
export function checkSeries(findings: Findings, series: Series): boolean {
  const { path, names, columns, missing, first, least = 1, value } = series;
  const before = findings.faults.length;
  const [keys, values] = columns;
  if (keys.length === 0 && values.length === 0) {
    findings.fault(`${path}.${names[0]}`, missing);
    return false;
  }
  if (keys.length !== values.length)
    findings.fault(`${path}.${names[0]}`, 'Both columns need the same number of values.');
  else if (keys.length < least)
    findings.fault(`${path}.${names[0]}`, `Give ${least} rows or more.`);
  for (let i = 0; i < keys.length && findings.faults.length - before < MOST; i++) {
    if (!Number.isFinite(keys[i])) findings.fault(`${path}.${names[0]}[${i}]`, 'Write a number.');
    else if (i > 0 && keys[i] <= keys[i - 1])
      findings.fault(
        `${path}.${names[0]}[${i}]`,
        `${first} must grow from row to row${keys[i] === keys[i - 1] ? '; this one stands twice' : ''}.`,
      );
    const wrong = Number.isFinite(values[i]) ? (value?.(values[i]) ?? null) : 'Write a number.';
    if (wrong && i < values.length) findings.fault(`${path}.${names[1]}[${i}]`, wrong);
  }
  return findings.faults.length === before;
}
