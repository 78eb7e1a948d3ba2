import type { ReservoirResult, StructureRegime, StructureResult } from '../case/resultFile';
import type { HazardClass } from '../hazard/hazardClass';
import type { ReviewState } from '../review/types';
import type { StationDifference } from '../studies/stationDifferences';
import type { LevelResult } from './levelResult';
import type { AlongQuery } from './schemas';
import type { Said } from '../units/message';
import type { StructureMark } from '../structures/structureMarks';

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
  /** Inflow of the reach for the time ribbon, at most 400 points: s and m³/s. From a reservoir it is known once it is routed. */
  inflow: { times: number[]; flows: number[] };
  /** It only tries the outlet of another run and is not checked itself. */
  triesOutlet: boolean;
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
  /** At those of them that levels were given for. */
  levels: LevelResult[];
  /** Stations and levels of a signed run are those of its signature: when it was, and what is otherwise today. */
  signed: { at: string; differs: StationDifference[] } | null;
  volume: {
    initial: number;
    inflow: number;
    lateral: number;
    outflow: number;
    final: number;
    error: number;
    relativeError: number;
  };
  /** In the order of the case; empty where nothing stands in the river. */
  structures: RunStructure[];
  /** null where the upstream end is no reservoir. */
  reservoir: RunReservoir | null;
  warnings: (Said & { code: string; chainage: number | null; time: number | null })[];
  /** The rule by which arrival was told. */
  arrivalRule: Said;
  steps: number;
  cellUpdates: number;
  seconds: number;
  cellCount: number;
  /** m. */
  cellSize: number;
}

/** What is read first of a structure. SI; times in s from start. */
export interface RunStructure extends StructureMark {
  /** Where its numbers come from. */
  note: string;
  /** Of every time step. */
  peak: StructureResult['peak'];
  /** How the water passes it: from each time on, until the next. */
  regimes: { time: number; regime: StructureRegime }[];
  /** Of a failing dam: when it began (null: never), its width and bottom at the end. */
  breach?: { begins: number | null; width: number; bottom: number };
}

/** Peaks at the output times. */
export interface RunReservoir {
  peakStage: number;
  peakStageTime: number;
  peakRelease: number;
  peakReleaseTime: number;
  balance: ReservoirResult['balance'];
}

/** `GET /api/runs/:runId/structures/:structure`, counted from 1 in the order of the summary. */
export interface RunStructureSeries {
  times: number[];
  flow: number[];
  stageUp: number[];
  stageDown: number[];
  regime: StructureRegime[];
  /** Of a failing dam: width and level of the bottom. */
  breach?: { width: number[]; bottom: number[] };
}

/** `GET /api/runs/:runId/reservoir`. */
export interface RunReservoirSeries {
  times: number[];
  stage: number[];
  volume: number[];
  inflow: number[];
  release: number[];
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

/** Hazard and arrival at a place, from the stored moments. */
export interface PlaceAlong {
  chainage: number;
  /** Class of `HAZARD_GUIDELINE`; null where it stays dry. */
  hazard: HazardClass['label'] | null;
  /** When that class is first reached, s. */
  hazardFrom: number | null;
  /** When the threshold is first passed, s; null: never. */
  arrival: number | null;
}

/** `GET /api/runs/:runId/along?threshold=…&value=…`. */
export interface RunAlong {
  threshold: AlongQuery['threshold'];
  value: number;
  /** Between the moments that it is told from, s. */
  interval: number;
  sections: (PlaceAlong & { id: string })[];
  stations: (PlaceAlong & { stationId: number; name: string })[];
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
  | { type: 'ended'; state: RunState };
