import { QueryTypes } from 'sequelize';
import type { TaskSetKind, TaskState } from '../../../shared/tasks/types';
import { unpackJson } from '../../database/packedJson';
import { conflict } from '../../errors';
import type { TaskModel } from '../../models/Task';
import type { TaskSetModel } from '../../models/TaskSet';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { RUN_OF_SET } from './signedSet';

/** How the members of a set stand. */
export interface TaskCounts {
  total: number;
  finished: number;
  failed: number;
  /** 0..1 */
  progress: number;
}
export interface CountedTaskSet {
  set: TaskSetModel;
  counts: TaskCounts;
}

/** Sets by id, study or firm, with who asked for them; their tasks and results. */
export function buildFindTaskSets({ models, sequelize }: Platform) {
  const { Study, Task, TaskSet, User } = models;
  const include = [
    { model: User, as: 'requester', attributes: ['id', 'name'] },
    RUN_OF_SET,
    { model: Study, as: 'study', attributes: ['id', 'unitSystem'] },
  ];

  async function counted(sets: TaskSetModel[]): Promise<CountedTaskSet[]> {
    if (sets.length === 0) return [];
    const rows = await sequelize.query<{
      setId: number;
      state: TaskState;
      count: number;
      share: number;
    }>(
      `SELECT set_id AS setId, state, COUNT(*) AS count, SUM(progress) AS share FROM tasks
       WHERE set_id IN (?) AND part = 'member' GROUP BY set_id, state`,
      { type: QueryTypes.SELECT, replacements: [sets.map(({ id }) => id)] },
    );
    const all = new Map<number, TaskCounts>();
    for (const { setId, state, count, share } of rows) {
      const id = Number(setId);
      const counts = all.get(id) ?? { total: 0, finished: 0, failed: 0, progress: 0 };
      counts.total += Number(count);
      if (state === 'finished') counts.finished += Number(count);
      if (state === 'failed') counts.failed += Number(count);
      counts.progress += state === 'running' ? Number(share) : 0;
      all.set(id, counts);
    }
    return sets.map((set) => {
      const counts = all.get(set.id) ?? { total: 0, finished: 0, failed: 0, progress: 0 };
      const { total, finished, failed, progress } = counts;
      return {
        set,
        counts: { ...counts, progress: total === 0 ? 0 : (finished + failed + progress) / total },
      };
    });
  }

  return {
    /** For `authorize`: of its firm, whether it belongs to a study or not. */
    async load(setId: number, _actor: Actor): Promise<Loaded<TaskSetModel> | null> {
      const set = await TaskSet.findByPk(setId, { include });
      return set && { record: set, subject: { firmId: set.firmId } };
    },
    again: (setId: number): Promise<TaskSetModel> =>
      TaskSet.findByPk(setId, { include, rejectOnEmpty: true }),

    /** Newest first. */
    list: async (where: {
      studyId?: number;
      firmId?: number;
      runId?: number;
      caseHash?: string;
      kind?: TaskSetKind;
      state?: TaskState;
    }): Promise<CountedTaskSet[]> =>
      counted(await TaskSet.findAll({ where, include, order: [['id', 'DESC']] })),
    counts: async (set: TaskSetModel): Promise<TaskCounts> => (await counted([set]))[0].counts,

    /** The members in their order. */
    tasks: ({ id }: TaskSetModel): Promise<TaskModel[]> =>
      Task.findAll({ where: { setId: id, part: 'member' }, order: ['position'] }),

    /** What all tasks of the set share. */
    async input<Input>({ id }: TaskSetModel): Promise<Input> {
      const attributes = ['id', 'input'];
      const set = await TaskSet.unscoped().findByPk(id, { attributes, rejectOnEmpty: true });
      return unpackJson<Input>(set.input);
    },

    /** What was made of its members. Throws `conflict` where there is nothing yet. */
    async result<Outcome>({ id, state }: TaskSetModel): Promise<Outcome> {
      const where = { setId: id, part: 'gather', state: 'finished' } as const;
      const gathered =
        state === 'finished'
          ? await Task.unscoped().findOne({ where, attributes: ['id', 'result'] })
          : null;
      if (!gathered?.result)
        throw conflict('The set has no result: it can be read when the set has finished.');
      return unpackJson<Outcome>(gathered.result);
    },

    /** What one member was given; null where it is none of the set's. */
    async payload<Payload>({ id }: TaskSetModel, taskId: number) {
      const where = { id: taskId, setId: id, part: 'member' as const };
      const attributes = ['id', 'label', 'payload'];
      const task = await Task.unscoped().findOne({ where, attributes });
      return task && { label: task.label, payload: await unpackJson<Payload>(task.payload) };
    },

    /** Payloads and results of the members; `result` is null where one has none. */
    async members<Payload, Result>({ id }: TaskSetModel) {
      const rows = await Task.unscoped().findAll({
        where: { setId: id, part: 'member' },
        order: ['position'],
      });
      return Promise.all(
        rows.map(async ({ position, label, state, failure, payload, result }) => ({
          index: position,
          label,
          state,
          failure,
          payload: await unpackJson<Payload>(payload),
          result: result && (await unpackJson<Result>(result)),
        })),
      );
    },
  };
}
