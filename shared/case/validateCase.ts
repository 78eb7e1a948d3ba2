import { CASE_FORMAT, type CaseFile } from './caseFile';
import {
  checkDownstream,
  checkLaterals,
  checkUpstream,
  type ReachEnds,
} from './validate/boundaryFaults';
import { Faults, kindOf, type CaseFault } from './validate/faults';
import { checkInitial } from './validate/initialFaults';
import { checkNumerics } from './validate/numericsFaults';
import { checkSections } from './validate/sectionFaults';
import { checkLocalLosses, checkRoughnessFactors } from './validate/stretchFaults';
import { checkStructures } from './validate/structureFaults';

export type { CaseFault } from './validate/faults';

export interface CheckedCase {
  /** All of them, in the order of the document; empty where the case is sound */
  faults: CaseFault[];
  /** null where there are faults */
  caseFile: CaseFile | null;
}

const REQUIRED = [
  'format',
  'title',
  'sections',
  'upstream',
  'downstream',
  'laterals',
  'structures',
  'initial',
  'numerics',
];

/** Checks a parsed case file against everything that the solver relies on. Pure; never throws. */
export function validateCase(value: unknown): CheckedCase {
  const faults = new Faults();
  if (!faults.record('', value, REQUIRED, ['gravity', 'roughnessFactors', 'localLosses'])) {
    return { faults: [{ ...faults.list[0], path: '(case)' }], caseFile: null };
  }
  const has = (key: string): boolean => key in value;
  if (has('format') && value.format !== CASE_FORMAT) {
    faults.add('format', `must be "${CASE_FORMAT}", not ${kindOf(value.format)}`);
  }
  if (has('title')) faults.text('title', value.title, 500);
  if (
    value.gravity !== undefined &&
    faults.number('gravity', value.gravity, 'an acceleration in m/s²')
  ) {
    if (value.gravity < 1 || value.gravity > 30) {
      faults.add('gravity', `is ${value.gravity} m/s²; on Earth it is 9.78 to 9.83`);
    }
  }
  const ends = reachEnds(value.sections);
  const count = Array.isArray(value.sections) ? value.sections.length : 0;
  if (has('sections')) checkSections(faults, value.sections);
  if (has('upstream')) checkUpstream(faults, value.upstream);
  if (has('downstream')) checkDownstream(faults, value.downstream);
  if (has('laterals')) checkLaterals(faults, value.laterals, ends);
  if (has('structures')) checkStructures(faults, value, ends);
  if (value.roughnessFactors !== undefined) {
    checkRoughnessFactors(faults, value.roughnessFactors, ends);
  }
  if (value.localLosses !== undefined) checkLocalLosses(faults, value.localLosses, ends);
  if (has('initial')) checkInitial(faults, value.initial, ends, value.upstream, value.downstream);
  if (has('numerics')) checkNumerics(faults, value.numerics, ends, count);
  const sound = faults.list.length === 0;
  return { faults: faults.list, caseFile: sound ? (value as unknown as CaseFile) : null };
}

function reachEnds(sections: unknown): ReachEnds {
  if (!Array.isArray(sections) || sections.length < 2) return null;
  const chainageOf = (section: unknown): unknown =>
    typeof section === 'object' && section !== null && 'chainage' in section
      ? section.chainage
      : undefined;
  const first = chainageOf(sections[0]);
  const last = chainageOf(sections[sections.length - 1]);
  const usable =
    typeof first === 'number' &&
    typeof last === 'number' &&
    Number.isFinite(first) &&
    Number.isFinite(last) &&
    last > first;
  return usable ? [first, last] : null;
}
