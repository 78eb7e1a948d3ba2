/** Work beside the runs: a set of tasks, each computed by a worker thread on its own. */
export const TASK_SET_KINDS = [
  'convergence',
  'sensitivity',
  'ensemble',
  'calibration',
  'verification',
] as const;
export type TaskSetKind = (typeof TASK_SET_KINDS)[number];

/** `finished` with failed members too: a member that fails does not spoil its set. */
export const TASK_STATES = ['queued', 'running', 'finished', 'failed', 'cancelled'] as const;
export type TaskState = (typeof TASK_STATES)[number];

export const TASK_STATE_WORDS: Record<TaskState, string> = {
  queued: 'Queued',
  running: 'Running',
  finished: 'Finished',
  failed: 'Stopped with a fault',
  cancelled: 'Cancelled',
};

/** `GET /api/studies/:studyId/task-sets?kind=…`, newest first. */
export interface TaskSetRow {
  id: number;
  kind: TaskSetKind;
  /** Verification belongs to no study. */
  studyId: number | null;
  scenarioId: number | null;
  /** The run whose frozen case the set varies, and its number within the study. */
  runId: number | null;
  runNumber: number | null;
  name: string;
  state: TaskState;
  /** 0..1 over all tasks. */
  progress: number;
  /** s of wall time; null where unknown. */
  secondsLeft: number | null;
  total: number;
  finished: number;
  failed: number;
  /** Why the set as a whole gave nothing. */
  failure: string | null;
  requestedBy: string;
  requestedAt: string;
  finishedAt: string | null;
}

export interface TaskRow {
  id: number;
  /** Order within its set, from 0. */
  index: number;
  label: string;
  state: TaskState;
  progress: number;
  failure: string | null;
}

/** `GET /api/task-sets/:taskSetId`. */
export interface TaskSet extends TaskSetRow {
  /** `sha256:…` of the case that the members vary. */
  caseHash: string | null;
  solverVersion: string;
  /** What was chosen; its type is that of the kind. */
  settings: unknown;
  tasks: TaskRow[];
  may: ('taskSet.cancel' | 'taskSet.retry')[];
  /** Why what is left of it is not computed again, though some is; null: it may be, or nothing is left. */
  whyNoRetry: string | null;
}
