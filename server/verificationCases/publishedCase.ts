import type { CaseFile } from '../../shared/case/caseFile';
import type { ResultFile } from '../../shared/case/resultFile';
import type { Measure, VerificationCase } from '../../shared/verificationCases/types';

/** Stage (m) and flow (m³/s) at a place, or at a moment. */
export interface StageAndFlow {
  stage: number;
  flow: number;
}

/** What was computed, by chainage (m) or by time (s). */
export interface Reading {
  along: 'chainage' | 'time';
  at: readonly number[];
  bed: readonly number[] | null;
  stage: readonly number[];
  flow: readonly number[];
}

/** A case on one grid. */
export interface Problem {
  caseFile: CaseFile;
  /** By chainage (m) at the last moment, or by time (s) where `read` reads along time. */
  exact: (at: number) => StageAndFlow;
  /** What of the result is compared; left out: every cell at the last moment. */
  read?: (result: ResultFile) => Reading;
  /** A standing jump: the norms leave out its surroundings, and how far it is out of place is measured apart. */
  jump?: { at: number; height: number; disturbed: number };
  /** Ends of what is compared; left out: the whole reach. */
  from?: number;
  to?: number;
}

/** Bounds on the finest grid. */
export type Bounds = Partial<Record<Measure, number>>;

/** A case with a known answer. The source of its numbers stands in `source`, with what of it is from memory. */
export interface PublishedCase extends VerificationCase {
  /** Numbers of cells, coarse to fine. */
  grids: readonly number[];
  bounds: Bounds;
  problem(cells: number): Problem;
}
