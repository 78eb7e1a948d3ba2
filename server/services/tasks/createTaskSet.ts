import type { TaskSetKind } from '../../../shared/tasks/types';
import { LIMITS } from '../../../shared/limits';
import { packJson } from '../../database/packedJson';
import { conflict } from '../../errors';
import type { TaskSetModel } from '../../models/TaskSet';
import type { Platform } from '../../platform';
import { SOLVER_VERSION } from '../../solvers';

export interface NewTaskSet {
  kind: TaskSetKind;
  name: string;
  studyId?: number | null;
  scenarioId?: number | null;
  runId?: number | null;
  /** Of the case that is varied, where there is one. */
  caseHash?: string | null;
  /** What was chosen, to be shown. */
  settings: unknown;
  /** What every task needs: JSON. */
  input: unknown;
  members: { label: string; payload: unknown }[];
}

/**
 * Puts a set with all its tasks into the queue: all or nothing. Throws `conflict` where too many sets of the firm wait already.
 * `queued` is called once it stands there.
 */
export function buildCreateTaskSet(platform: Platform, queued: () => void) {
  const { audit, sequelize, models, now } = platform;
  const { Task, TaskSet } = models;

  return async (
    actor: { id: number; firmId: number },
    wanted: NewTaskSet,
  ): Promise<TaskSetModel> => {
    const { input, members, ...of } = wanted;
    if (members.length === 0) throw new RangeError('A set of tasks has one at least.');
    const packed = await packJson(input);
    const rows = await Promise.all(
      members.map(async ({ label, payload }, position) => ({
        position,
        label: label.slice(0, 160),
        part: 'member' as const,
        state: 'queued' as const,
        payload: await packJson(payload),
      })),
    );
    const set = await sequelize.transaction(async (transaction) => {
      const { firmId } = actor;
      const open = await TaskSet.count({
        where: { firmId, state: ['queued', 'running'] },
        transaction,
      });
      if (open >= LIMITS.openTaskSets)
        throw conflict(
          `${open} sets of your firm wait or run already. Nothing was started; cancel one, or wait until one has ended.`,
        );
      const made = await TaskSet.create(
        {
          ...of,
          name: of.name.slice(0, 160),
          studyId: of.studyId ?? null,
          scenarioId: of.scenarioId ?? null,
          runId: of.runId ?? null,
          caseHash: of.caseHash ?? null,
          firmId,
          state: 'queued',
          input: packed,
          solverVersion: SOLVER_VERSION,
          requestedBy: actor.id,
          requestedAt: now(),
        },
        { transaction },
      );
      await Task.bulkCreate(
        rows.map((row) => ({ ...row, setId: made.id })),
        { transaction },
      );
      const words = `Set of ${rows.length} computations asked for: ${made.name}`;
      const record = { kind: 'taskSet', id: made.id };
      await audit.note({ action: 'taskSet.requested', words, record, actor }, transaction);
      return made;
    });
    queued();
    return set;
  };
}
