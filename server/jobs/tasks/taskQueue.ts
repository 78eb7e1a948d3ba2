import { randomUUID } from 'node:crypto';
import { QueryTypes, Transaction, type Sequelize } from 'sequelize';
import type { TaskSetKind } from '../../../shared/tasks/types';
import { partsOf, say, type Said } from '../../../shared/units/message';
import type { Models } from '../../models';
import { failureFields, failureSaid } from '../../models/failure';
import type { TaskModel } from '../../models/Task';
import { retryOnDeadlock } from '../retryOnDeadlock';
import { MAX_ATTEMPTS, type QueueTiming } from '../timing';
import type { StoredWork } from './taskMessages';

/** A task taken from the queue. Only who holds `token` may write to it; each claim has a fresh one. */
export interface TaskClaim {
  taskId: number;
  setId: number;
  kind: TaskSetKind;
  part: 'member' | 'gather';
  token: string;
}

export type TaskEnding =
  | { state: 'finished'; result: Uint8Array }
  | { state: 'failed'; failure: Said }
  | { state: 'cancelled' };

export type TaskQueue = ReturnType<typeof taskQueue>;

/**
 * The durable queue of tasks: the tables themselves, claimed with SKIP LOCKED and held by a lease on the clock of the
 * database, as runs are. Sets take turns, so that a long one starves none; runs go before all of them. Whoever locks both
 * locks the set first.
 */
export function taskQueue(sequelize: Sequelize, { Task, TaskSet }: Models, timing: QueueTiming) {
  const isolation = { isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED };
  const lock = Transaction.LOCK.UPDATE;
  const leaseEnd = sequelize.literal(
    `NOW(3) + INTERVAL ${timing.lease * 1000} MICROSECOND`,
  ) as unknown as Date;
  const now = sequelize.literal('NOW(3)') as unknown as Date;
  const noLease = { leaseOwner: null, leaseUntil: null };
  const held = ({ taskId, token }: TaskClaim) => ({
    id: taskId,
    leaseOwner: token,
    state: 'running' as const,
  });
  const select = <R extends object>(sql: string, given: unknown[] = [], within?: Transaction) =>
    sequelize.query<R>(sql, {
      type: QueryTypes.SELECT,
      replacements: given,
      transaction: within,
    });
  const ids = async (sql: string) =>
    (await select<{ id: number }>(sql)).map(({ id }) => Number(id));

  const claimOf = (setId: number): Promise<TaskClaim | null> =>
    sequelize.transaction(isolation, async (transaction) => {
      const set = await TaskSet.findByPk(setId, { lock, transaction });
      if (!set || (set.state !== 'queued' && set.state !== 'running')) return null;
      // Sequelize drops SKIP LOCKED for this database without a word, hence the plain SQL.
      const [found] = await select<{ id: number }>(
        "SELECT id FROM tasks WHERE set_id = ? AND state = 'queued' ORDER BY position LIMIT 1 FOR UPDATE SKIP LOCKED",
        [setId],
        transaction,
      );
      if (!found) return null;
      const task = (await Task.findByPk(Number(found.id), { transaction }))!;
      const token = randomUUID();
      await task.update(
        {
          state: 'running',
          progress: 0,
          attempts: task.attempts + 1,
          leaseOwner: token,
          leaseUntil: leaseEnd,
          startedAt: now,
        },
        { transaction },
      );
      await set.update(
        { state: 'running', servedAt: now, ...(set.startedAt ? {} : { startedAt: now }) },
        { transaction },
      );
      return { taskId: task.id, setId, kind: set.kind, part: task.part, token };
    });

  /** Locks the set and the claimed task; null where the claim was lost. */
  const lockHeld = async (claim: TaskClaim, transaction: Transaction) => {
    const set = await TaskSet.findByPk(claim.setId, { lock, transaction });
    const task = await Task.findOne({ where: held(claim), lock, transaction });
    return set && task && { set, task };
  };

  return {
    /** The next task of the set that waits longest, now ours; null where none waits, or a run does. */
    async claim(): Promise<TaskClaim | null> {
      if ((await ids("SELECT id FROM runs WHERE state = 'queued' LIMIT 1")).length > 0) return null;
      const waiting = await ids(
        `SELECT s.id FROM task_sets s WHERE s.state IN ('queued', 'running')
         AND EXISTS (SELECT 1 FROM tasks t WHERE t.set_id = s.id AND t.state = 'queued')
         ORDER BY s.served_at, s.id`,
      );
      for (const setId of waiting) {
        const claim = await retryOnDeadlock(() => claimOf(setId));
        if (claim) return claim;
      }
      return null;
    },

    /** What its worker needs. */
    async read({ taskId, setId, kind, part }: TaskClaim): Promise<StoredWork> {
      const set = await TaskSet.unscoped().findByPk(setId, {
        attributes: ['id', 'input'],
        rejectOnEmpty: true,
      });
      const { input } = set;
      const Full = Task.unscoped();
      if (part === 'member') {
        const attributes = ['id', 'payload', 'notes'];
        const { payload, notes } = await Full.findByPk(taskId, { attributes, rejectOnEmpty: true });
        return { setId, kind, input, what: { part, payload, notes } };
      }
      const members = (
        await Full.findAll({
          where: { setId, part: 'member' },
          attributes: ['id', 'position', 'label', 'payload', 'result'],
          order: ['position'],
        })
      ).map(({ position, label, payload, result }) => ({
        index: position,
        label,
        payload,
        result,
      }));
      return { setId, kind, input, what: { part, members } };
    },

    /** Renews the lease and notes the progress; false where the task is to be stopped, or is somebody else's. */
    async renew(claim: TaskClaim, progress: number): Promise<boolean> {
      await retryOnDeadlock(() =>
        Task.update({ leaseUntil: leaseEnd, progress }, { where: held(claim) }),
      );
      const rows = await select(
        `SELECT t.id FROM tasks t JOIN task_sets s ON s.id = t.set_id
         WHERE t.id = ? AND t.lease_owner = ? AND t.state = 'running' AND s.state = 'running'`,
        [claim.taskId, claim.token],
      );
      return rows.length > 0;
    },

    /** Keeps what the task has found so far for another attempt, should this one break off. */
    async note(claim: TaskClaim, notes: Uint8Array): Promise<void> {
      await retryOnDeadlock(() =>
        Task.update({ notes: Buffer.from(notes) }, { where: held(claim) }),
      );
    },

    /** Writes how the task ended, once; false where the claim was lost. A set that was cancelled keeps no late results. */
    finish: (claim: TaskClaim, ending: TaskEnding): Promise<boolean> =>
      retryOnDeadlock(() =>
        sequelize.transaction(isolation, async (transaction) => {
          const found = await lockHeld(claim, transaction);
          if (!found) return false;
          const { set, task } = found;
          const state = set.state === 'cancelled' ? 'cancelled' : ending.state;
          const result =
            state === 'finished' && ending.state === 'finished' ? Buffer.from(ending.result) : null;
          const failure = state === 'failed' && ending.state === 'failed' ? ending.failure : null;
          await task.update(
            {
              ...noLease,
              state,
              result,
              ...failureFields(failure),
              finishedAt: now,
              ...(state === 'finished' && { progress: 1, notes: null }),
            },
            { transaction },
          );
          return true;
        }),
      ),

    /** Puts a task back that this process will not finish, as if it had not been begun. */
    async release(claim: TaskClaim): Promise<void> {
      const attempts = sequelize.literal('attempts - 1') as unknown as number;
      await Task.update(
        { ...noLease, state: 'queued', progress: 0, attempts },
        { where: held(claim) },
      );
    },

    /** Lets the next look at the tasks that were left take it: the lease ends now, for the reason given. */
    async abandon(claim: TaskClaim, why: string): Promise<void> {
      const leaseUntil = sequelize.literal('NOW(3) - INTERVAL 1 SECOND') as unknown as Date;
      await Task.update({ leaseUntil, interruption: why.slice(0, 500) }, { where: held(claim) });
    },

    /** Tasks whose worker or server is gone go back into the queue, at most twice; then they fail and say why. */
    async recover(): Promise<number[]> {
      const recovered: number[] = [];
      for (const id of await ids(
        "SELECT id FROM tasks WHERE state = 'running' AND lease_until < NOW(3)",
      )) {
        await sequelize.transaction(isolation, async (transaction) => {
          const [found] = await select(
            "SELECT id FROM tasks WHERE id = ? AND state = 'running' AND lease_until < NOW(3) FOR UPDATE SKIP LOCKED",
            [id],
            transaction,
          );
          if (!found) return;
          const task = (await Task.findByPk(id, { transaction }))!;
          const set = (await TaskSet.findByPk(task.setId, { transaction }))!;
          const spent = task.attempts >= MAX_ATTEMPTS;
          const state = set.state === 'cancelled' ? 'cancelled' : spent ? 'failed' : 'queued';
          await task.update(
            {
              ...noLease,
              state,
              progress: 0,
              ...failureFields(
                state === 'failed' ? { message: brokeOff(task.attempts, task.interruption) } : null,
              ),
              finishedAt: state === 'queued' ? null : now,
            },
            { transaction },
          );
          recovered.push(id);
        });
      }
      return recovered;
    },

    /**
     * Sets all of whose tasks have ended: the task that gathers is added where the kind has one and some member has a result, or
     * the set ends. Answers the sets that ended.
     */
    async conclude(gathers: (kind: TaskSetKind) => boolean): Promise<number[]> {
      const ended: number[] = [];
      for (const setId of await ids(
        `SELECT s.id FROM task_sets s WHERE s.state IN ('queued', 'running')
         AND NOT EXISTS (SELECT 1 FROM tasks t WHERE t.set_id = s.id AND t.state IN ('queued', 'running'))`,
      )) {
        const over = await retryOnDeadlock(() =>
          sequelize.transaction(isolation, async (transaction) => {
            const set = await TaskSet.findByPk(setId, { lock, transaction });
            const tasks = await Task.findAll({
              where: { setId },
              order: ['position'],
              transaction,
            });
            const goesOn = tasks.some(({ state }) => state === 'queued' || state === 'running');
            if (!set || goesOn || (set.state !== 'queued' && set.state !== 'running')) return false;
            const members = tasks.filter(({ part }) => part === 'member');
            const gather = tasks.find(({ part }) => part === 'gather');
            const some = members.some(({ state }) => state === 'finished');
            if (some && !gather && gathers(set.kind)) {
              await Task.create(
                {
                  setId,
                  position: members.length,
                  part: 'gather',
                  label: 'Result of the set',
                  state: 'queued',
                  payload: Buffer.alloc(0),
                },
                { transaction },
              );
              return false;
            }
            const failure = some ? gather && failureSaid(gather) : noneOf(members);
            await set.update(
              {
                state: failure ? 'failed' : 'finished',
                ...failureFields(failure ?? null),
                finishedAt: now,
              },
              { transaction },
            );
            return true;
          }),
        );
        if (over) ended.push(setId);
      }
      return ended;
    },
  };
}

function noneOf(members: TaskModel[]): Said {
  const why = members.length > 0 && failureSaid(members[0]);
  return say`None of its ${members.length} members came to a result. The first says: ${why ? partsOf(why) : 'nothing'}`;
}

const brokeOff = (attempts: number, interruption: string | null): string =>
  `It was begun ${attempts} times and broke off each time, the last time because ` +
  `${interruption ?? 'the server stopped while it was being computed'}. Try it again, with larger cells if it needs much memory.`;
