import type { UnitSystem } from '../../../shared/units/units';
import type { RunResiduals } from '../../../shared/calibration/types';
import type { Station } from '../../../shared/studies/types';

/** What an export says of a run beside its numbers. Plain data: it travels to a worker thread. */
export interface ExportedRun {
  number: number;
  studyTitle: string;
  scenarioName: string;
  verticalDatum: string;
  unitSystem: UnitSystem;
  requestedBy: string;
  /** ISO 8601 */
  finishedAt: string;
  /** Clock time of t = 0, ISO 8601; null where there is none. */
  startsAt: string | null;
  caseHash: string;
  solverVersion: string;
  stations: Station[];
  /** Against the observed flood of its report. */
  observed?: RunResiduals | null;
}

/** Clock time of a moment, ISO 8601 in UTC to the second. */
export const clockTime = (startsAt: string, seconds: number): string =>
  new Date(Date.parse(startsAt) + seconds * 1000).toISOString().replace(/\.\d+Z$/, 'Z');
