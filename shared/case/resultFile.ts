import type { Said } from '../units/message';

/** The result file: what a run gives back. SI throughout; see caseFile.ts. */

export const RESULT_FORMAT = 'spate-result/1';

/** Rise of stage (m) above the initial one, or depth (m) at a place that was dry, that counts as arrival. */
export const ARRIVAL_RISE = 0.1;

export interface ArrivalThreshold {
  /** The rule in words. */
  text: string;
  /** m above the initial stage */
  rise: number;
  /** m above the bed, at places that were dry */
  depth: number;
}

export interface SectionPeak {
  stage: number;
  stageTime: number;
  flow: number;
  flowTime: number;
  depth: number;
  velocity: number;
}

/** One surveyed section; each array has one entry an output time. A dry place has stage = bed and zeros. */
export interface SectionResult {
  id: string;
  chainage: number;
  bed: number;
  stage: number[];
  depth: number[];
  flow: number[];
  area: number[];
  velocity: number[];
  froude: number[];
  peak: SectionPeak;
  /** s; null where the wave never comes */
  arrival: number | null;
}

/** One entry a cell, upstream to downstream; chainage is that of the middle of the cell. */
export interface CellResults {
  chainage: number[];
  bed: number[];
  initialStage: number[];
  peakStage: number[];
  peakStageTime: number[];
  peakDepth: number[];
  peakFlow: number[];
  peakFlowTime: number[];
  peakVelocity: number[];
  arrival: (number | null)[];
  finalStage: number[];
  finalDepth: number[];
  finalFlow: number[];
}

/** m³; error = final - initial - inflow - lateral + outflow. */
export interface VolumeBalance {
  initial: number;
  inflow: number;
  lateral: number;
  outflow: number;
  final: number;
  error: number;
  relativeError: number;
}

export type StructureRegime =
  | 'dry'
  | 'closed'
  | 'free'
  | 'drowned'
  | 'pipe'
  | 'drownedPipe'
  | 'gate'
  | 'drownedGate'
  | 'rating'
  | 'inletControl'
  | 'outletControl'
  | 'overtopped';

/** One structure; each array has one entry an output time. */
export interface StructureResult {
  id: string;
  kind: string;
  /** The boundary between cells at which it was computed (m) */
  chainage: number;
  /** Positive downstream */
  flow: number[];
  stageUp: number[];
  stageDown: number[];
  regime: StructureRegime[];
  /** Of every time step */
  peak: { flow: number; flowTime: number; stageUp: number; stageUpTime: number };
  /** Of a breach: bottom width and bottom level (m) */
  breach?: { width: number[]; bottom: number[] };
}

/** The level pool at the head of the reach; each array has one entry an output time. */
export interface ReservoirResult {
  stage: number[];
  /** m³ */
  volume: number[];
  inflow: number[];
  release: number[];
  /** m³; error = final - initial - inflow + release */
  balance: {
    initial: number;
    inflow: number;
    release: number;
    final: number;
    error: number;
    relativeError: number;
  };
}

export type WarningCode =
  | 'aboveSurvey'
  | 'supercritical'
  | 'initialNotSettled'
  | 'initialDry'
  | 'initialLimited'
  | 'damMoved'
  | 'structureMoved'
  | 'lateralLimited'
  | 'frictionless'
  | 'outletSupercritical'
  | 'ratingExceeded'
  | 'banksUnpaired';

export interface RunWarning extends Said {
  code: WarningCode;
  chainage: number | null;
  time: number | null;
}

export interface ResultFile {
  format: typeof RESULT_FORMAT;
  caseHash: string;
  solver: string;
  times: number[];
  arrivalThreshold: ArrivalThreshold;
  sections: SectionResult[];
  cells: CellResults;
  /** Where the case has any. */
  structures?: StructureResult[];
  /** Where the upstream end is one. */
  reservoir?: ReservoirResult;
  volume: VolumeBalance;
  steps: number;
  cellUpdates: number;
  /** Seconds of computing: the only field that may differ between two runs of one case. */
  seconds: number;
  warnings: RunWarning[];
}
