import type { ObservedFlood } from '../../../../shared/calibration/compareFlood';
import type {
  Evaluation,
  SearchResult,
  SearchStretch,
} from '../../../../shared/calibration/search/types';
import { withFactors } from '../../../../shared/calibration/search/withFactors';
import type { CaseFile } from '../../../../shared/case/caseFile';
import { RunFailed, SOLVER_VERSION } from '../../../solvers';
import { taskKind } from '../taskKind';
import { computeFlood } from './floodOfResult';
import { searchRoughness } from './searchRoughness';

export interface CalibrationInput {
  caseFile: CaseFile;
  observed: ObservedFlood;
  startsAt: string | null;
  stretches: SearchStretch[];
  evaluations: number;
  /** m. */
  cellSize: number;
}

/** What another attempt goes on from; of another solver the runs would not be the same. */
interface SearchNotes {
  solver: string;
  evaluations: Evaluation[];
}

/** Runs that tell how flat the optimum is, at most, a stretch. */
const FLATNESS_RUNS = 4;

/** A search is one member: each run depends on those before it. */
export const calibrationKind = taskKind<CalibrationInput, null, SearchResult, SearchResult>({
  compute(_payload, input, { shouldStop, onProgress, kept, keep }) {
    const { caseFile, observed, stretches, cellSize, evaluations } = input;
    const places = observed.gauges.map(({ chainage }) => chainage);
    const all = evaluations + FLATNESS_RUNS * stretches.length;
    const notes = kept as SearchNotes | null;
    const known = notes?.solver === SOLVER_VERSION ? notes.evaluations : [];
    const tell = (done: number) => onProgress(Math.min(0.999, done / all));
    tell(known.length);
    return searchRoughness(
      input,
      (factors) =>
        computeFlood(withFactors(caseFile, stretches, factors, cellSize), places, shouldStop),
      (error) => error instanceof RunFailed,
      (evaluations) => {
        tell(evaluations.length);
        keep({ solver: SOLVER_VERSION, evaluations } satisfies SearchNotes);
      },
      known,
    );
  },
  gather: ([{ result }]) => result!,
});
