import type { ReservoirInput, StructureInput } from './structures';

/**
 * The case file: everything that a run depends on, in one JSON document.
 * Units are SI (m, s, m³/s). Stages and elevations are above the datum of the study; chainage grows downstream.
 */

export const CASE_FORMAT = 'spate-case/1';

/** [offset, elevation] in m, offsets never decreasing; equal offsets make a vertical wall. */
export type SectionPoint = [number, number];

/** [from offset, Manning's n]: holds up to the next entry; n >= 0. */
export type RoughnessZone = [number, number];

export interface SectionInput {
  id: string;
  chainage: number;
  points: SectionPoint[];
  roughness: RoughnessZone[];
  /** Offsets of the left and the right bank. */
  banks?: [number, number];
  /** Stretches that hold water but do not carry it. */
  storage?: StoragePart[];
  /** Ground behind them stays dry until the stage is over the crest. */
  embankments?: { left?: Embankment; right?: Embankment };
}

/** Between two offsets water is stored and does not flow along the reach; where `flowsAbove` (m) is given, up to that stage. */
export interface StoragePart {
  from: number;
  to: number;
  flowsAbove?: number;
}

/** Keeps the ground from its offset to the end of the section on its side dry while the stage is below its crest (m). */
export interface Embankment {
  offset: number;
  crest: number;
}

/**
 * Manning's n of a stretch of the reach (m) is multiplied by a factor, which may vary with depth (m): linear between the
 * given depths, held beyond them; one depth is a constant factor. Where several cover a place they multiply.
 */
export interface RoughnessFactor {
  from: number;
  to: number;
  /** Between the bank marks, outside them, or both; without bank marks the whole section is channel. */
  part: 'all' | 'channel' | 'overbank';
  depths: number[];
  factors: number[];
}

/** Head lost where the river narrows or widens: these shares of the change of velocity head. */
export interface LocalLoss {
  from: number;
  to: number;
  contraction: number;
  expansion: number;
}

/** Values are linear in time between the given ones, and held before the first and after the last. */
export interface FlowSeries {
  times: number[];
  flows: number[];
}
export interface StageSeries {
  times: number[];
  stages: number[];
}

export type Upstream =
  | ({ kind: 'inflow' } & FlowSeries)
  | ({ kind: 'stage' } & StageSeries)
  | ({ kind: 'reservoir' } & ReservoirInput)
  | { kind: 'wall' };

export type Downstream =
  | { kind: 'normalDepth'; slope: number }
  | ({ kind: 'stage' } & StageSeries)
  | { kind: 'rating'; stages: number[]; flows: number[] }
  | { kind: 'criticalDepth' }
  | { kind: 'open' }
  | { kind: 'wall' };

/** Total flow over the stretch from..to (from = to: at a point). Negative takes water out. */
export interface Lateral extends FlowSeries {
  from: number;
  to: number;
}

export type Initial =
  | { kind: 'steady' }
  | { kind: 'still'; stage: number }
  | { kind: 'profile'; chainages: number[]; stages: number[]; flows: number[] }
  | {
      kind: 'dam';
      chainage: number;
      /** null: dry */
      stageAbove: number | null;
      stageBelow: number | null;
    };

export interface Numerics {
  /** A wish: the reach is cut into round(length / cellSize) equal cells, at least one. */
  cellSize: number;
  duration: number;
  outputInterval: number;
  order?: 1 | 2;
  courant?: number;
  dryDepth?: number;
  /** Momentum coefficient: 1, or that of the parts of a compound section by their conveyance. */
  momentum?: 'uniform' | 'compound';
}

export interface CaseFile {
  format: typeof CASE_FORMAT;
  title: string;
  gravity?: number;
  sections: SectionInput[];
  upstream: Upstream;
  downstream: Downstream;
  laterals: Lateral[];
  structures: StructureInput[];
  roughnessFactors?: RoughnessFactor[];
  localLosses?: LocalLoss[];
  initial: Initial;
  numerics: Numerics;
}

/** What an omitted field means. */
export const CASE_DEFAULTS = {
  gravity: 9.80665,
  order: 2,
  courant: 0.8,
  dryDepth: 0.001,
  momentum: 'uniform',
} as const;
