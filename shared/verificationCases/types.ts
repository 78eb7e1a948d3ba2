import type { TaskSetRow, TaskState } from '../tasks/types';

/** Cases with published answers, routed by the solver that routes the floods. SI throughout. */

export const CASE_GROUPS = ['still', 'dam', 'states', 'steady', 'waves'] as const;
export type CaseGroup = (typeof CASE_GROUPS)[number];

/** A case as it is described to people. */
export interface VerificationCase {
  id: string;
  group: CaseGroup;
  title: string;
  /** What is set up and what is asked. */
  setup: string;
  /** The published source in full; from where its numbers are taken. */
  source: string;
  shows: string;
  doesNotShow: string;
  /** Why the bounds stand where they stand. */
  boundReason: string;
}

/** Differences between computed and exact values over all places that count. */
export interface ErrorNorms {
  /** Mean of the magnitudes: the L1 norm over the length. */
  l1: number;
  /** Root of the mean square: the L2 norm over the root of the length. */
  l2: number;
  /** Largest magnitude: the L∞ norm. */
  max: number;
}

export const NORMS = ['l1', 'l2', 'max'] as const;

/** One grid of a case. */
export interface GridErrors {
  cells: number;
  /** m */
  cellSize: number;
  /** m */
  stage: ErrorNorms;
  /** m³/s */
  flow: ErrorNorms;
  /** Order observed in L1 against the grid before; null on the first, and where rounding is all that is left. */
  stageOrder: number | null;
  flowOrder: number | null;
  /** Share of the water that was lost or made. */
  volumeError: number;
  steps: number;
  /** s of computing */
  seconds: number;
}

/** What a bound is set to, always on the finest grid. */
export const MEASURES = [
  'stageL1',
  'stageMax',
  'flowL1',
  'flowMax',
  'stageOrder',
  'flowOrder',
  'jumpShift',
  'volume',
] as const;
export type Measure = (typeof MEASURES)[number];

export interface Criterion {
  measure: Measure;
  /** null where it could not be measured: not within the bound. */
  value: number | null;
  bound: number;
  /** An order must be at least its bound, everything else at most. */
  within: boolean;
}

/** Computed beside exact on the finest grid, in the order of place or time. */
export interface CaseCurves {
  /** Chainage, m, or time from start, s. */
  along: 'chainage' | 'time';
  at: number[];
  /** m; null along time. */
  bed: number[] | null;
  /** m */
  stage: { computed: number[]; exact: number[] };
  /** m³/s */
  flow: { computed: number[]; exact: number[] };
  /** Stretches that the norms leave out, because a jump stands in them. */
  leftOut: [number, number][];
}

/** What routing a case gives. */
export interface VerificationResult {
  caseId: string;
  solver: string;
  grids: GridErrors[];
  criteria: Criterion[];
  /** All criteria. */
  within: boolean;
  curves: CaseCurves;
  /** s of computing, all grids */
  seconds: number;
}

/** Of a result, what a list shows. */
export interface VerificationSummary {
  within: boolean;
  solver: string;
  /** Computed by the version that routes the floods today. */
  isCurrent: boolean;
  computedAt: string;
  requestedBy: string;
  /** s of computing */
  seconds: number;
  /** Norms on the finest grid. */
  stage: ErrorNorms;
  flow: ErrorNorms;
}

/** A case with how its last computation stands, and what the last finished one gave. */
export interface VerificationCaseRow extends VerificationCase {
  latest: {
    state: TaskState;
    /** 0..1 */
    progress: number;
    failure: string | null;
    taskSetId: number;
    at: string | null;
  } | null;
  result: VerificationSummary | null;
}

/** `GET /api/verification-cases`. */
export interface VerificationList {
  /** The version that routes the floods today. */
  solver: string;
  cases: VerificationCaseRow[];
  /** Sets under way, newest first. */
  open: TaskSetRow[];
}

/** `GET /api/verification-cases/result?caseId=…`. */
export interface VerificationDetail {
  solver: string;
  row: VerificationCaseRow;
  result: VerificationResult | null;
}
