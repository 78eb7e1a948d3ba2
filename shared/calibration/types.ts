import type { MARK_CONFIDENCES, MARK_KINDS } from './marks';

export type MarkKind = (typeof MARK_KINDS)[number];
export type MarkConfidence = (typeof MARK_CONFIDENCES)[number];

/** How high the water stood somewhere at the height of an observed flood. SI. */
export interface Mark {
  id: number;
  /** m. */
  chainage: number;
  /** m above the study's datum. */
  level: number;
  kind: MarkKind;
  confidence: MarkConfidence;
  /** The flood that left it, e.g. `January 2024`; marks of different floods are never compared with one run. */
  flood: string;
  /** Day it was seen or surveyed, `2024-01-09`. */
  observedOn: string | null;
  note: string;
}

export interface TimeValues {
  /** s, rising. */
  times: number[];
  /** m above the study's datum, or m³/s. */
  values: number[];
}

/** A gauge without its record. */
export interface GaugeRow {
  id: number;
  name: string;
  /** m. */
  chainage: number;
  flood: string;
  /** Clock time of its t = 0, ISO 8601 in UTC; null: its times count from the start of the run. */
  startsAt: string | null;
  stageCount: number;
  flowCount: number;
  /** m and m³/s. */
  peakStage: number | null;
  peakFlow: number | null;
}

export interface Gauge extends GaugeRow {
  stage: TimeValues | null;
  flow: TimeValues | null;
}

/** `GET /api/studies/:studyId/observations`. */
export interface Observations {
  marks: Mark[];
  gauges: GaugeRow[];
  /** The names of floods that marks and gauges carry, as first met. */
  floods: string[];
}

/** A mark against the highest water of a run. */
export interface MarkResidual {
  mark: Mark;
  /** m; null off the reach, or where the place stayed dry. */
  computed: number | null;
  why: 'offReach' | 'dry' | null;
  /** Computed less observed, m. */
  residual: number | null;
  /** m: what its confidence means. */
  tolerance: number;
}

/** Of residuals e (computed less observed, m). */
export interface ResidualSummary {
  count: number;
  /** Mean of e: which way the model leans. */
  mean: number;
  /** Root of the mean of e². */
  rms: number;
  /** Largest |e|. */
  largest: number;
  /** How many lie within their tolerance. */
  within: number;
}

/** A gauge's record of one quantity against a run, over the times that both have. */
export interface GaugeFit {
  gaugeId: number;
  name: string;
  chainage: number;
  quantity: 'stage' | 'flow';
  /** Why it cannot be compared; the figures are then null. */
  why: 'offReach' | 'noClock' | 'noOverlap' | null;
  figures: GaugeFigures | null;
  /** Observed and computed at the observed times, s from the start of the run, at most some hundred. */
  series: { times: number[]; observed: number[]; computed: number[] } | null;
}

export interface GaugeFigures {
  count: number;
  /** Nash and Sutcliffe (1970): 1 is perfect, 0 no better than the mean; null where the record does not vary. */
  efficiency: number | null;
  mean: number;
  rms: number;
  /** Largest observed and computed value with its time, s; null where the record begins or ends with its highest value. */
  peak: {
    observed: { value: number; time: number };
    computed: { value: number; time: number };
    /** Computed less observed. */
    error: number;
    /** s; positive: computed too late. */
    delay: number;
  } | null;
}

/** `GET /api/runs/:runId/residuals?flood=…`. */
export interface RunResiduals {
  runId: number;
  /** The flood whose observations are compared. */
  flood: string;
  /** What is printed in the report of the run; null: nothing. */
  reported: string | null;
  marks: MarkResidual[];
  all: ResidualSummary | null;
  byKind: { kind: MarkKind; summary: ResidualSummary }[];
  byConfidence: { confidence: MarkConfidence; summary: ResidualSummary }[];
  gauges: GaugeFit[];
  /** Misfit in tolerances, see `misfit.ts`; null where nothing could be compared. */
  misfit: number | null;
}

/** A table of marks as it was pasted or read from a file; nothing of it is stored. SI. */
export interface MarksReading {
  marks: Omit<Mark, 'id'>[];
  /** How the columns were understood, in words. */
  understood: string;
  faults: { path: string; message: string }[];
}
