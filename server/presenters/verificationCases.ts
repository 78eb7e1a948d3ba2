import type {
  VerificationCase,
  VerificationCaseRow,
  VerificationResult,
  VerificationSummary,
} from '../../shared/verificationCases/types';
import type { TaskModel } from '../models/Task';
import type { TaskSetModel } from '../models/TaskSet';
import { SOLVER_VERSION } from '../solvers';
import type { PublishedCase } from '../verificationCases';

/** Where a case stands: its last task, and of the last that finished the result in short. */
export interface CaseStanding {
  task: TaskModel;
  finishedTaskId: number | null;
  summary: VerificationSummary | null;
}

export const describeCase = ({
  id,
  group,
  title,
  setup,
  source,
  shows,
  doesNotShow,
  boundReason,
}: PublishedCase): VerificationCase => ({
  id,
  group,
  title,
  setup,
  source,
  shows,
  doesNotShow,
  boundReason,
});

export const presentCase = (
  published: PublishedCase,
  standing: CaseStanding | undefined,
): VerificationCaseRow => ({
  ...describeCase(published),
  latest: standing
    ? {
        state: standing.task.state,
        progress: standing.task.progress,
        failure: standing.task.failure,
        taskSetId: standing.task.setId,
        at: standing.task.finishedAt?.toISOString() ?? null,
      }
    : null,
  result: standing?.summary ?? null,
});

/** Needs the set's `requester`. */
export function summaryOf(
  result: VerificationResult,
  task: TaskModel,
  set: TaskSetModel,
): VerificationSummary {
  const finest = result.grids[result.grids.length - 1];
  return {
    within: result.within,
    solver: result.solver,
    isCurrent: result.solver === SOLVER_VERSION,
    computedAt: (task.finishedAt ?? set.requestedAt).toISOString(),
    requestedBy: set.requester!.name,
    seconds: result.seconds,
    stage: finest.stage,
    flow: finest.flow,
  };
}
