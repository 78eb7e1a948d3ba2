import type { Run, RunRow } from '../../shared/runs/types';
import { failureIn } from '../models/failure';
import type { RunModel } from '../models/Run';
import { may } from '../policies/decide';
import type { Actor } from '../policies/subject';
import { reviewStateOf } from './reviewState';

/** Needs the run's `requester` and what tells of its checking. */
export const presentRunRow = (run: RunModel): RunRow => ({
  id: run.id,
  number: run.number,
  scenarioId: run.scenarioId,
  scenarioName: run.scenarioName,
  state: run.state,
  review: reviewStateOf(run),
  progress: run.progress,
  secondsLeft: run.secondsLeft ?? null,
  requestedBy: run.requester!.name,
  requestedAt: run.requestedAt.toISOString(),
  startedAt: run.startedAt?.toISOString() ?? null,
  finishedAt: run.finishedAt?.toISOString() ?? null,
  peakStage: run.peakStage ?? null,
  peakFlow: run.peakFlow ?? null,
});

/** Needs the run's `requester` and `study`. */
export const presentRun = (run: RunModel, actor: Actor): Run => ({
  ...presentRunRow(run),
  studyId: run.studyId,
  studyTitle: run.study!.title,
  reachId: run.reachId,
  startsAt: run.startsAt?.toISOString() ?? null,
  caseHash: run.caseHash,
  solverVersion: run.solverVersion,
  duration: run.duration,
  attempts: run.attempts,
  failure: failureIn(run.study!.unitSystem, run),
  inflow: run.inflow,
  triesOutlet: Boolean(run.triedFor),
  may: actionsOf(run, actor),
});

function actionsOf(run: RunModel, actor: Actor): Run['may'] {
  const subject = { firmId: run.study!.firmId };
  const actions: Run['may'] = [];
  if (may(actor, 'run.read', subject)) actions.push('run.read');
  if (!may(actor, 'run.change', subject)) return actions;
  if (run.state === 'queued' || run.state === 'running') actions.push('run.cancel');
  if (run.state === 'failed' || run.state === 'cancelled') actions.push('run.retry');
  return actions;
}
