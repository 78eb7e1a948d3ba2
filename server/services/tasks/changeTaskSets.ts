import { TASK_STATE_WORDS } from '../../../shared/tasks/types';
import { conflict } from '../../errors';
import { failureFields } from '../../models/failure';
import type { TaskSetModel } from '../../models/TaskSet';
import type { Platform } from '../../platform';
import { RUN_OF_SET, signedSet } from './signedSet';

interface Needs {
  /** Stops what this process computes of a set. */
  stop: (setId: number) => void;
  /** Tasks wait in the queue. */
  queued: () => void;
}

/** Cancel and try again. Both throw `conflict` where the set is past it. */
export function buildChangeTaskSets({ audit, sequelize, models, now }: Platform, needs: Needs) {
  const { Task, TaskSet } = models;

  return {
    /** What waits is cancelled at once, what goes on within a second or two; what has finished stays readable. */
    async cancel({ id }: TaskSetModel): Promise<void> {
      await sequelize.transaction(async (transaction) => {
        const lock = transaction.LOCK.UPDATE;
        const set = await TaskSet.findByPk(id, { lock, transaction, rejectOnEmpty: true });
        if (set.state !== 'queued' && set.state !== 'running')
          throw conflict('The set has ended already; there is nothing to cancel.');
        await set.update({ state: 'cancelled', finishedAt: now() }, { transaction });
        await Task.update(
          { state: 'cancelled', finishedAt: now() },
          { where: { setId: id, state: 'queued' }, transaction },
        );
        const record = { kind: 'taskSet', id };
        const words = `Set cancelled: ${set.name}`;
        await audit.note({ action: 'taskSet.cancelled', words, record }, transaction);
      });
      needs.stop(id);
    },

    /** Computes again what failed or was cancelled, and gathers all members anew; finished members stay. */
    async retry({ id }: TaskSetModel): Promise<void> {
      await sequelize.transaction(async (transaction) => {
        const lock = transaction.LOCK.UPDATE;
        const set = await TaskSet.findByPk(id, { lock, transaction, rejectOnEmpty: true });
        const where = { setId: id, state: ['failed', 'cancelled'] as ('failed' | 'cancelled')[] };
        const left = await Task.count({ where, transaction });
        const going = await Task.count({ where: { setId: id, state: 'running' }, transaction });
        if (set.state === 'queued' || set.state === 'running' || going > 0)
          throw conflict('The set has not ended yet; wait for it, or cancel it.');
        if (left === 0)
          throw conflict(
            `The set is ${TASK_STATE_WORDS[set.state].toLowerCase()} and none of its members failed; there is nothing to try again.`,
          );
        const ofRun = await TaskSet.findByPk(id, {
          include: [RUN_OF_SET],
          transaction,
          rejectOnEmpty: true,
        });
        const signed = signedSet(ofRun);
        if (signed) throw conflict(signed);
        await Task.destroy({ where: { setId: id, part: 'gather' }, transaction });
        await Task.update(
          {
            state: 'queued',
            progress: 0,
            attempts: 0,
            interruption: null,
            ...failureFields(null),
            startedAt: null,
            finishedAt: null,
          },
          { where, transaction },
        );
        await set.update(
          { state: 'queued', ...failureFields(null), startedAt: null, finishedAt: null },
          { transaction },
        );
        const record = { kind: 'taskSet', id };
        const words = `Members that were left put into the queue again: ${set.name}`;
        await audit.note({ action: 'taskSet.retried', words, record }, transaction);
      });
      needs.queued();
    },
  };
}
