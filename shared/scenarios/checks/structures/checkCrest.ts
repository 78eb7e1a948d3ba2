import { CASE_LIMITS } from '../../../case/caseLimits';
import type { Findings } from '../Findings';

interface Crest {
  offsets: number[];
  levels: number[];
}

/** Said of one crest at most. */
const MOST = 20;

/** A crest as two columns, offsets never falling; true where it can be used. `missing`: what to say of none; null where it may be left out. */
export function checkCrest(
  findings: Findings,
  path: string,
  { offsets, levels }: Crest,
  missing: string | null,
): boolean {
  const at = `${path}.offsets`;
  if (offsets.length === 0 && levels.length === 0) {
    if (missing !== null) findings.fault(at, missing);
    return false;
  }
  const before = findings.faults.length;
  if (offsets.length !== levels.length)
    findings.fault(at, 'Both columns need the same number of values.');
  else if (offsets.length < 2) findings.fault(at, 'Give two points or more: both ends.');
  else if (offsets.length > CASE_LIMITS.crestPoints)
    findings.fault(at, `Give at most ${CASE_LIMITS.crestPoints} points.`);
  for (let i = 0; i < offsets.length && findings.faults.length - before < MOST; i++) {
    if (!Number.isFinite(offsets[i]) || !Number.isFinite(levels[i]))
      findings.fault(`${at}[${i}]`, 'Write a number.');
    else if (i > 0 && offsets[i] < offsets[i - 1])
      findings.fault(`${at}[${i}]`, 'Offsets must grow from left to right.');
  }
  if (findings.faults.length === before && offsets[offsets.length - 1] <= offsets[0])
    findings.fault(at, 'It has no length: give the offsets of both its ends.');
  return findings.faults.length === before;
}
