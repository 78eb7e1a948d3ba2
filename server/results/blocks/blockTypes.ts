import type { ArrivalThreshold, RunWarning, VolumeBalance } from '../../../shared/case/resultFile';
import type { RunReservoir, RunStructure } from '../../../shared/runs/types';

/**
 * How a routed run is stored, one row a block, each gzipped:
 * - facts: JSON, everything that is not an array over places (`RunFacts`);
 * - places: columns, every cell and every surveyed section by chainage with its exact peaks (`PlaceColumns`);
 * - series, one part a surveyed section: columns, exact at every output time (`SeriesColumns`);
 * - wave, one part for each `PLACES_PER_PART` places of the wave: columns, decimated (`WaveColumns`);
 * - structure, one part a structure: columns, exact at every output time (`StructureColumns`);
 * - reservoir: the same of the pool at the head (`ReservoirColumns`).
 */
export const BLOCK_KINDS = ['facts', 'places', 'series', 'wave', 'structure', 'reservoir'] as const;
export type BlockKind = (typeof BLOCK_KINDS)[number];

export interface EncodedBlock {
  kind: BlockKind;
  part: number;
  /** gzip */
  bytes: Uint8Array;
}

/** Cells of the wave that are kept, moments of it, and how many places share a part. */
export const WAVE_LIMITS = { cells: 1000, moments: 600, placesPerPart: 32 } as const;

export interface RunFacts {
  times: number[];
  arrivalThreshold: ArrivalThreshold;
  volume: VolumeBalance;
  warnings: RunWarning[];
  steps: number;
  cellUpdates: number;
  seconds: number;
  cellCount: number;
  /** m */
  cellSize: number;
  inflowPeak: { flow: number; time: number } | null;
  sections: { id: string; chainage: number }[];
  /** Left out in runs that were stored before there were any. */
  structures?: RunStructure[];
  reservoir?: RunReservoir | null;
  /** Indexes into `times` of the moments that the wave keeps. */
  moments: number[];
}

/** One entry a place: the cells and the surveyed sections together, upstream to downstream. SI; NaN: never. */
export type PlaceColumns = {
  chainage: Float64Array;
  bed: Float64Array;
  leftBank: Float64Array;
  rightBank: Float64Array;
  peakStage: Float64Array;
  peakStageTime: Float64Array;
  peakDepth: Float64Array;
  peakFlow: Float64Array;
  peakFlowTime: Float64Array;
  peakVelocity: Float64Array;
  arrival: Float64Array;
  /** Index of the surveyed section, -1 for a cell. */
  section: Int32Array;
  /** Index among the places of the wave, -1 where the wave leaves the place out. */
  wave: Int32Array;
};

/** One entry an output time. */
export type SeriesColumns = Record<
  'stage' | 'depth' | 'flow' | 'area' | 'velocity' | 'froude',
  Float64Array
>;

/** One entry an output time; `regime` counts in `REGIMES`; width and bottom of a breach alone. */
export type StructureColumns = Record<'flow' | 'stageUp' | 'stageDown', Float64Array> & {
  regime: Int32Array;
  width?: Float64Array;
  bottom?: Float64Array;
};

/** One entry an output time. */
export type ReservoirColumns = Record<'stage' | 'volume' | 'inflow' | 'release', Float64Array>;

/** [place of the part * moments + moment] */
export type WaveColumns = Record<'depth' | 'flow' | 'velocity', Float32Array>;
