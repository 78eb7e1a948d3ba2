import type { ReviewState } from '../review/types';

/** States of a run, as stored. The words for them are in `RUN_STATE_WORDS`. */
export const RUN_STATES = ['queued', 'running', 'routed', 'failed', 'cancelled'] as const;
export type RunState = (typeof RUN_STATES)[number];

export const RUN_STATE_WORDS: Record<RunState, string> = {
  queued: 'Queued',
  running: 'Running',
  routed: 'Routed',
  failed: 'Stopped with a fault',
  cancelled: 'Cancelled',
};

/** `GET /api/studies/:studyId/runs`, newest first. */
export interface RunRow {
  id: number;
  /** Counted within the study: run 12. */
  number: number;
  scenarioId: number;
  scenarioName: string;
  state: RunState;
  /** Where its checking stands; null before it was sent. */
  review: ReviewState | null;
  /** 0..1. */
  progress: number;
  /** s of wall time; null where unknown. */
  secondsLeft: number | null;
  requestedBy: string;
  requestedAt: string;
  startedAt: string | null;
  finishedAt: string | null;
  /** m and m³/s at the outlet, the last surveyed section; null before the run is routed. */
  peakStage: number | null;
  peakFlow: number | null;
}

/** `GET /api/runs/:runId`. */
export interface Run extends RunRow {
  studyId: number;
  studyTitle: string;
  reachId: number;
  /** Clock time of t = 0. */
  startsAt: string | null;
  /** `sha256:…` of the frozen case. */
  caseHash: string;
  solverVersion: string;
  /** s. */
  duration: number;
  attempts: number;
  /** Where, when and why it stopped, and what to change. */
  failure: string | null;
  /** Inflow for the time ribbon, at most 400 points: s and m³/s. */
  inflow: { times: number[]; flows: number[] };
  may: ('run.cancel' | 'run.retry' | 'run.read')[];
}

/** Peaks at a place. SI; times in s from start. */
export interface PlacePeaks {
  chainage: number;
  bed: number;
  peakStage: number;
  peakStageTime: number;
  peakFlow: number;
  peakFlowTime: number;
  peakDepth: number;
  peakVelocity: number;
  /** null: the wave never comes. */
  arrival: number | null;
  /** Share of the inflow peak that is gone: 0.08 is 8 % less. null where there is no inflow. */
  attenuation: number | null;
}

/** `GET /api/runs/:runId/summary`. */
export interface RunSummary {
  runId: number;
  times: { start: number; end: number; interval: number; count: number };
  /** m³/s; null where the upstream end is not an inflow. */
  inflowPeak: { flow: number; time: number } | null;
  /** At each surveyed section. */
  sections: (PlacePeaks & { id: string })[];
  /** At the study's stations that lie on the reach. */
  stations: (PlacePeaks & { stationId: number; name: string })[];
  volume: {
    initial: number;
    inflow: number;
    lateral: number;
    outflow: number;
    final: number;
    error: number;
    relativeError: number;
  };
  warnings: { code: string; message: string; chainage: number | null; time: number | null }[];
  /** The rule by which arrival was told, in words. */
  arrivalRule: string;
  steps: number;
  cellUpdates: number;
  seconds: number;
  cellCount: number;
  /** m. */
  cellSize: number;
}

/** `GET /api/runs/:runId/series?chainage=…`: at the cells nearest the place, linear between; exact at a section. */
export interface RunSeries {
  chainage: number;
  sectionId: string | null;
  times: number[];
  stage: number[];
  depth: number[];
  flow: number[];
  velocity: number[];
  peaks: PlacePeaks;
}

/**
 * `GET /api/runs/:runId/surface?places=…&moments=…`: the whole wave for the long section, decimated for the width.
 * `application/octet-stream`, little-endian, see `surfaceBlock.ts`.
 */
export interface RunSurface {
  places: number;
  moments: number;
  /** Float64 of length `moments`, s. */
  times: Float64Array;
  /** Float64 of length `places`, m. */
  chainages: Float64Array;
  bed: Float32Array;
  leftBank: Float32Array;
  rightBank: Float32Array;
  peakStage: Float32Array;
  /** [moment * places + place]. */
  stage: Float32Array;
  flow: Float32Array;
}

/** Events of `GET /api/runs/:runId/events` (text/event-stream): each `data:` is one of these as JSON. */
export type RunEvent =
  | {
      type: 'progress';
      state: RunState;
      progress: number;
      secondsLeft: number | null;
      /** Simulated time of the surface, s. */
      time: number;
      /** Water surface of the moment, at most 300 places; null before the first. */
      surface: { chainages: number[]; bed: number[]; stage: number[] } | null;
    }
  | { type: 'ended'; state: RunState; failure: string | null };
