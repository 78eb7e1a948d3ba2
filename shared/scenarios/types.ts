import type { Fault } from '../errors';
import type { ScenarioBody } from './schemas';

/** `GET /api/studies/:studyId/scenarios`. */
export interface ScenarioRow {
  id: number;
  name: string;
  reachId: number;
  /** m³/s; null while there is no inflow. */
  peakInflow: number | null;
  faultCount: number;
  runCount: number;
  version: number;
  updatedAt: string;
  updatedBy: string;
}

/** `GET /api/scenarios/:scenarioId`. Faults stop a run; doubts do not. */
export interface Scenario extends ScenarioRow {
  studyId: number;
  body: ScenarioBody;
  faults: Fault[];
  doubts: Fault[];
  /** Proposed for this reach: what the form starts from. */
  proposals: { cellSize: number; outletSlope: number; duration: number; outputInterval: number };
}

/** A table read from a file or from pasted text: `POST /api/tables/read`. Times in s, values in SI. */
export interface TableReading {
  times: number[];
  values: number[];
  /** Clock time of the first value, ISO 8601 in UTC, where the table has dates. */
  startsAt?: string;
  /** How the columns were understood, in words for the person. */
  understood: string;
  faults: Fault[];
}
