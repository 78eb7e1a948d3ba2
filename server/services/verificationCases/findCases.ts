import { QueryTypes } from 'sequelize';
import type {
  VerificationDetail,
  VerificationList,
  VerificationResult,
} from '../../../shared/verificationCases/types';
import { unpackJson } from '../../database/packedJson';
import { notFound } from '../../errors';
import type { TaskModel } from '../../models/Task';
import type { TaskSetModel } from '../../models/TaskSet';
import type { Platform } from '../../platform';
import {
  describeCase,
  presentCase,
  summaryOf,
  type CaseStanding,
} from '../../presenters/verificationCases';
import { presentTaskSetRow } from '../../presenters/taskSets';
import { SOLVER_VERSION } from '../../solvers';
import { PUBLISHED_CASES, publishedCase } from '../../verificationCases';
import type { buildTasks } from '../tasks';

interface LatestTask {
  caseId: string;
  latest: number;
  finished: number | null;
}

/** How the published cases stand for a firm. The label of such a task is the id of its case. */
export function buildFindCases(
  { models, sequelize }: Platform,
  tasks: ReturnType<typeof buildTasks>,
) {
  const { Task, TaskSet, User } = models;
  /** Of the last finished task of a case and firm; a finished task never changes. */
  const summaries = new Map<string, { taskId: number; summary: ReturnType<typeof summaryOf> }>();

  async function resultsOf(taskIds: number[]): Promise<Map<number, VerificationResult>> {
    if (taskIds.length === 0) return new Map();
    const rows = await Task.unscoped().findAll({
      where: { id: taskIds },
      attributes: ['id', 'result'],
    });
    const pairs = rows.map(
      async ({ id, result }) => [id, await unpackJson<VerificationResult>(result!)] as const,
    );
    return new Map(await Promise.all(pairs));
  }

  /** The last task of each case, and the last that finished. */
  async function standings(firmId: number): Promise<Map<string, CaseStanding>> {
    const found = await sequelize.query<LatestTask>(
      `SELECT t.label AS caseId, MAX(t.id) AS latest, MAX(IF(t.state = 'finished', t.id, NULL)) AS finished
       FROM tasks t JOIN task_sets s ON s.id = t.set_id
       WHERE s.firm_id = ? AND s.kind = 'verification' AND t.part = 'member' GROUP BY t.label`,
      { type: QueryTypes.SELECT, replacements: [firmId] },
    );
    const ids = found.flatMap(({ latest, finished }) => [Number(latest), Number(finished ?? 0)]);
    const rows = await Task.findAll({ where: { id: ids } });
    const sets = await TaskSet.findAll({
      where: { id: [...new Set(rows.map(({ setId }) => setId))] },
      include: [{ model: User, as: 'requester', attributes: ['id', 'name'] }],
    });
    const taskOf = new Map<number, TaskModel>(rows.map((row) => [row.id, row]));
    const setOf = new Map<number, TaskSetModel>(sets.map((set) => [set.id, set]));

    const keyOf = (caseId: string) => `${firmId}/${caseId}`;
    const unread = found.flatMap(({ caseId, finished }) =>
      finished !== null && summaries.get(keyOf(caseId))?.taskId !== Number(finished)
        ? [Number(finished)]
        : [],
    );
    const read = await resultsOf(unread);
    return new Map(
      found.map(({ caseId, latest, finished }) => {
        const task = taskOf.get(Number(latest))!;
        const done = finished === null ? undefined : taskOf.get(Number(finished));
        const result = done && read.get(done.id);
        if (done && result)
          summaries.set(keyOf(caseId), {
            taskId: done.id,
            summary: summaryOf(result, done, setOf.get(done.setId)!),
          });
        const summary = done ? (summaries.get(keyOf(caseId))?.summary ?? null) : null;
        return [caseId, { task, finishedTaskId: done?.id ?? null, summary }];
      }),
    );
  }

  return {
    standings,

    async list(firmId: number): Promise<VerificationList> {
      const kind = 'verification';
      const [found, running, queued] = await Promise.all([
        standings(firmId),
        tasks.find.list({ firmId, kind, state: 'running' }),
        tasks.find.list({ firmId, kind, state: 'queued' }),
      ]);
      return {
        solver: SOLVER_VERSION,
        cases: PUBLISHED_CASES.map((published) => presentCase(published, found.get(published.id))),
        open: [...queued, ...running].map(presentTaskSetRow),
      };
    },

    /** Throws `notFound` where there is no such case. */
    async detail(firmId: number, caseId: string): Promise<VerificationDetail> {
      const published = publishedCase(caseId);
      if (!published) throw notFound('This case');
      const standing = (await standings(firmId)).get(caseId);
      const id = standing?.finishedTaskId ?? null;
      const results = await resultsOf(id === null ? [] : [id]);
      return {
        solver: SOLVER_VERSION,
        row: presentCase(published, standing),
        result: (id !== null && results.get(id)) || null,
      };
    },

    /** Every case that has a result, with it, in the order of the list. */
    async finished(firmId: number) {
      const found = await standings(firmId);
      const ids = [...found.values()].flatMap(({ finishedTaskId }) => finishedTaskId ?? []);
      const results = await resultsOf(ids);
      return PUBLISHED_CASES.flatMap((published) => {
        const standing = found.get(published.id);
        const result = results.get(standing?.finishedTaskId ?? 0);
        const summary = standing?.summary;
        return result && summary ? [{ about: describeCase(published), result, summary }] : [];
      });
    },
  };
}
