import { memberLabel } from '../../shared/confidence/memberLabel';
import type { TaskRow, TaskSet, TaskSetRow } from '../../shared/tasks/types';
import { failureIn } from '../models/failure';
import type { TaskModel } from '../models/Task';
import type { TaskSetModel } from '../models/TaskSet';
import { may } from '../policies/decide';
import type { Actor } from '../policies/subject';
import { signedSet } from '../services/tasks/signedSet';
import type { CountedTaskSet, TaskCounts } from '../services/tasks/findTaskSets';

/** Needs the set's `requester`, `run` with its `signOff`, and `study`. */
export const presentTaskSetRow = ({ set, counts }: CountedTaskSet): TaskSetRow => ({
  id: set.id,
  kind: set.kind,
  studyId: set.studyId,
  scenarioId: set.scenarioId,
  runId: set.runId,
  runNumber: set.run?.number ?? null,
  name: set.name,
  state: set.state,
  progress: counts.progress,
  secondsLeft: secondsLeft(set, counts),
  total: counts.total,
  finished: counts.finished,
  failed: counts.failed,
  failure: failureIn(systemOf(set), set),
  requestedBy: set.requester!.name,
  requestedAt: set.requestedAt.toISOString(),
  finishedAt: set.finishedAt?.toISOString() ?? null,
});

export const presentTaskSet = (
  set: TaskSetModel,
  counts: TaskCounts,
  tasks: TaskModel[],
  actor: Actor,
): TaskSet => ({
  ...presentTaskSetRow({ set, counts }),
  caseHash: set.caseHash,
  solverVersion: set.solverVersion,
  settings: set.settings,
  tasks: tasks.map((task) => presentTask(task, set)),
  may: actionsOf(set, tasks, actor),
  whyNoRetry: isLeft(set, tasks) ? signedSet(set) : null,
});

const presentTask = (task: TaskModel, set: TaskSetModel): TaskRow => ({
  id: task.id,
  index: task.position,
  label: memberLabel(set, task, systemOf(set)),
  state: task.state,
  progress: task.progress,
  failure: failureIn(systemOf(set), task),
});

/** Verification belongs to no study and is told in SI. */
const systemOf = ({ study }: TaskSetModel) => study?.unitSystem ?? 'metric';

function actionsOf(set: TaskSetModel, tasks: TaskModel[], actor: Actor): TaskSet['may'] {
  if (!may(actor, 'taskSet.change', { firmId: set.firmId })) return [];
  if (set.state === 'queued' || set.state === 'running') return ['taskSet.cancel'];
  return isLeft(set, tasks) && signedSet(set) === null ? ['taskSet.retry'] : [];
}

/** It has ended, and some of it without a result. */
const isLeft = ({ state }: TaskSetModel, tasks: TaskModel[]): boolean =>
  state !== 'queued' &&
  state !== 'running' &&
  tasks.some((task) => task.state === 'failed' || task.state === 'cancelled');

/** By the pace so far; null where there is too little to go by. */
function secondsLeft({ state, startedAt }: TaskSetModel, { progress }: TaskCounts): number | null {
  if (state !== 'running' || !startedAt || progress < 0.005) return null;
  const spent = (Date.now() - startedAt.getTime()) / 1000;
  return Math.ceil((spent * (1 - progress)) / progress);
}
