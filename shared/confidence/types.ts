import type { CaseFile } from '../case/caseFile';
import type { GridConvergence } from './gridConvergence';
import type { Parameter, ParameterKey } from './parameters';
import type { Variation } from './varyCase';

/** A place whose values are told one by one: a station of the study, or the last section where none was chosen. */
export interface NamedPlace {
  name: string;
  /** m */
  chainage: number;
}

/** What every member of a set reads: the frozen case of the run, and where to look. */
export interface ConfidenceInput {
  caseFile: CaseFile;
  stations: NamedPlace[];
  /** Chainages (m) along the reach at which peaks are kept. */
  places: number[];
  /** Whether stage and flow against time are kept at the stations. */
  series: boolean;
}

export interface ConfidencePayload {
  /** What it stands for among the members; the words of it are the label of the task. */
  role:
    | { kind: 'base' }
    | { kind: 'grid'; step: number }
    | { kind: 'side'; parameter: ParameterKey; side: 'low' | 'high'; value: number }
    | { kind: 'draw'; draw: number };
  variation: Variation;
}

/** Peaks at a place: m, m³/s, s. `arrival` is null where the wave never comes. */
export interface PlaceValues {
  peakStage: number;
  peakFlow: number;
  arrival: number | null;
}

/** What is kept of a member: not the whole wave. */
export interface MemberSummary {
  /** m, and how many */
  cellSize: number;
  cells: number;
  /** s of computing */
  seconds: number;
  volumeError: number;
  warnings: number;
  stations: PlaceValues[];
  /** At `places`, in their order. */
  along: { bed: number[]; peakStage: number[]; peakFlow: number[]; arrival: (number | null)[] };
  /** [station][output time]; null where series are not kept. */
  series: { times: number[]; stage: number[][]; flow: number[][] } | null;
}

/** One quantity at a place on the three grids, fine to coarse; null where a grid has no value. */
export interface GridRow {
  values: (number | null)[];
  /** null where a grid has no value. */
  convergence: GridConvergence | null;
  /** Half width of the band around the finest value that the index gives, in the unit of the value; null without an order. */
  band: number | null;
}

export interface ConvergenceResult {
  kind: 'convergence';
  /** Fine to coarse. */
  grids: { cellSize: number | null; cells: number | null; seconds: number | null }[];
  stations: (NamedPlace & { peakStage: GridRow; peakFlow: GridRow; arrival: GridRow })[];
  along: {
    chainage: number[];
    bed: number[];
    /** Finest grid that has a result. */
    peakStage: number[];
    /** Second grid less the finest, m. */
    difference: number[];
    /** Half width of the band, m; null where there is no order. */
    band: (number | null)[];
    /** Middle of the observed orders of the peak stage along the reach; null where none can be told. */
    order: number | null;
    /** Share of the places at which the three grids converge one way. */
    monotone: number;
  };
  /** Where the finest two differ most in peak stage. */
  widest: { chainage: number; difference: number };
}

export interface SensitivitySide {
  value: number;
  /** In the order of the stations; null where the member failed. */
  stations: PlaceValues[] | null;
}
export interface SensitivityResult {
  kind: 'sensitivity';
  /** m */
  cellSize: number;
  stations: NamedPlace[];
  base: PlaceValues[];
  rows: { parameter: ParameterKey; low: SensitivitySide; high: SensitivitySide }[];
}

/** Three curves over times or places. */
export interface BandSeries {
  p5: number[];
  p50: number[];
  p95: number[];
}
export interface EnsembleStation extends NamedPlace {
  /** The base case on the cells of the members; null where it failed. */
  base: PlaceValues | null;
  stage: BandSeries;
  flow: BandSeries;
  /** In the order of `drawn`. */
  peakStages: number[];
  peakFlows: number[];
  arrivals: (number | null)[];
}
export interface EnsembleResult {
  kind: 'ensemble';
  /** m */
  cellSize: number;
  /** Members with a result, the base case not counted, and how many failed. */
  members: number;
  failed: number;
  /** The members with a result: their index among the tasks and what was drawn for each. */
  drawn: { index: number; variation: Variation }[];
  times: number[];
  stations: EnsembleStation[];
  along: { chainage: number[]; bed: number[]; base: number[] | null; peakStage: BandSeries };
}

export type ConfidenceResult = ConvergenceResult | SensitivityResult | EnsembleResult;

/** `GET /api/runs/:runId/confidence`: what can be varied of a routed run, and with what. */
export interface ConfidenceOptions {
  runNumber: number;
  /** m, of the run's own cells */
  cellSize: number;
  cells: number;
  /** Length of the reach, m. */
  length: number;
  /** s of computing that the run took. */
  seconds: number;
  stations: { stationId: number; name: string; chainage: number }[];
  parameters: Parameter[];
}
