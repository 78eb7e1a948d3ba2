import type { InferType } from 'yup';
import type { RunResiduals } from '../types';
import type { searchSchema } from './schemas';

/** What was asked of a search; SI. */
export type SearchBody = InferType<typeof searchSchema>;
export type SearchStretch = SearchBody['stretches'][number];

/** What the task set keeps of it to be shown. */
export interface SearchSettings extends SearchBody {
  /** m: of the cells that the search runs on, and of those of the run. */
  cells: { search: number; run: number };
}

export interface Evaluation {
  /** 1-based, in the order in which they were run. */
  number: number;
  purpose: 'before' | 'search' | 'flatness';
  /** One a stretch. */
  factors: number[];
  /** null where the run failed or nothing could be compared. */
  misfit: number | null;
  failure: string | null;
}

/** How the misfit changes along one multiplier while the others stay at their best. */
export interface Flatness {
  /** Rising. */
  factors: number[];
  misfit: (number | null)[];
  /**
   * Second derivative of the squared misfit by the logarithm of the multiplier at the best, by least squares through the
   * points; null where fewer than three are known. Near 0: the observations do not tell.
   */
  curvature: number | null;
  /** Multipliers as good as the best (`nearBest`); open where they go on beyond what was tried. */
  range: { low: number; high: number; lowOpen: boolean; highOpen: boolean } | null;
  /** The best lies on a bound: the search wanted to go further. */
  atBound: 'low' | 'high' | null;
}

type Compared = Omit<RunResiduals, 'runId' | 'flood' | 'reported'>;

/** Result of a set of kind `calibration`. */
export interface SearchResult {
  best: { factors: number[]; misfit: number };
  /** With all multipliers at 1, on the same cells. */
  before: Compared;
  after: Compared;
  why: 'settled' | 'budget';
  evaluations: Evaluation[];
  /** One a stretch. */
  flatness: Flatness[];
}
