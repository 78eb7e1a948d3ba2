import { randomUUID } from 'node:crypto';
import { QueryTypes, Transaction, type Sequelize } from 'sequelize';
import type { Run as RunTold } from '../../shared/runs/types';
import type { Said } from '../../shared/units/message';
import type { Models } from '../models';
import { failureFields } from '../models/failure';
import type { EncodedBlock } from '../results/blocks/blockTypes';
import type { QueueTiming } from './timing';
import { retryOnDeadlock } from './retryOnDeadlock';

/** A run taken from the queue. Only who holds `token` may write to it; each claim has a fresh one. */
export interface Claim {
  runId: number;
  token: string;
  attempts: number;
  caseBytes: Uint8Array;
}

/** What became of a claim: still ours, ours but to be stopped, or given to somebody else. */
export type Standing = 'held' | 'cancelRequested' | 'lost';

export type Ending =
  | {
      state: 'routed';
      blocks: EncodedBlock[];
      solver: string;
      peakStage: number;
      peakFlow: number;
      /** Into the reach; null: as it was asked for. */
      inflow?: RunTold['inflow'] | null;
    }
  | { state: 'failed'; failure: Said }
  | { state: 'cancelled' };

export type RunQueue = ReturnType<typeof runQueue>;

/**
 * The durable queue of runs: the table `runs` itself. Several processes may work on it; a row is claimed with
 * SKIP LOCKED, so that none waits for another, and held by a lease on the clock of the database.
 */
export function runQueue(sequelize: Sequelize, { Run, RunBlock }: Models, timing: QueueTiming) {
  const isolation = { isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED };
  const leaseEnd = sequelize.literal(`NOW(3) + INTERVAL ${timing.lease * 1000} MICROSECOND`);
  const now = sequelize.literal('NOW(3)');
  const noLease = { leaseOwner: null, leaseUntil: null, secondsLeft: null };

  /** Sequelize drops SKIP LOCKED for this database without a word, hence the plain SQL. */
  const lockOne = async (where: string, transaction: Transaction) => {
    const rows = await sequelize.query<{ id: number }>(
      `SELECT id FROM runs WHERE ${where} ORDER BY id LIMIT 1 FOR UPDATE SKIP LOCKED`,
      { type: QueryTypes.SELECT, transaction },
    );
    return rows.length > 0 ? Number(rows[0].id) : null;
  };

  return {
    /** The oldest queued run, now ours; null where none waits. */
    claim: (): Promise<Claim | null> =>
      sequelize.transaction(isolation, async (transaction) => {
        const id = await lockOne("state = 'queued'", transaction);
        if (id === null) return null;
        const run = (await Run.unscoped().findByPk(id, { transaction }))!;
        const token = randomUUID();
        await run.update(
          {
            state: 'running',
            progress: 0,
            attempts: run.attempts + 1,
            leaseOwner: token,
            leaseUntil: leaseEnd as unknown as Date,
            startedAt: now as unknown as Date,
          },
          { transaction },
        );
        return { runId: id, token, attempts: run.attempts, caseBytes: run.caseBytes };
      }),

    /** Renews the lease, notes the progress, and tells how the claim stands. */
    async renew(
      { runId, token }: Claim,
      progress: number,
      secondsLeft: number | null,
    ): Promise<Standing> {
      const where = { id: runId, leaseOwner: token, state: 'running' as const };
      const change = { leaseUntil: leaseEnd as unknown as Date, progress, secondsLeft };
      await retryOnDeadlock(() => Run.update(change, { where }));
      const run = await Run.findOne({ where, attributes: ['cancelRequested'] });
      if (!run) return 'lost';
      return run.cancelRequested ? 'cancelRequested' : 'held';
    },

    /**
     * Writes how the run ended, with its results, in one transaction: all or nothing, once. False where the claim was
     * lost meanwhile. A cancel that came while it was finishing still counts.
     */
    finish: ({ runId, token }: Claim, ending: Ending): Promise<boolean> =>
      retryOnDeadlock(() =>
        sequelize.transaction(isolation, async (transaction) => {
          const run = await Run.findOne({
            where: { id: runId, leaseOwner: token, state: 'running' },
            lock: Transaction.LOCK.UPDATE,
            transaction,
          });
          if (!run) return false;
          const told = run.cancelRequested ? ({ state: 'cancelled' } as const) : ending;
          const finished = { ...noLease, finishedAt: now as unknown as Date };
          if (told.state === 'routed') {
            const { blocks, solver, peakStage, peakFlow, inflow } = told;
            for (const { kind, part, bytes } of blocks) {
              const row = { runId, kind, part, bytes: Buffer.from(bytes) };
              await RunBlock.create(row, { transaction });
            }
            const values = {
              ...finished,
              state: told.state,
              progress: 1,
              solverVersion: solver,
              peakStage,
              peakFlow,
              ...(inflow && { inflow }),
            };
            await run.update(values, { transaction });
          } else {
            const failure = failureFields(told.state === 'failed' ? told.failure : null);
            await run.update({ ...finished, state: told.state, ...failure }, { transaction });
          }
          return true;
        }),
      ),

    /** Puts a run back that this process will not finish, as if it had not been begun. */
    async release({ runId, token }: Claim): Promise<void> {
      await Run.update(
        {
          ...noLease,
          state: 'queued',
          progress: 0,
          attempts: sequelize.literal('attempts - 1') as unknown as number,
        },
        { where: { id: runId, leaseOwner: token, state: 'running' } },
      );
    },

    /** Lets the next look at the runs that were left take it: the lease ends now, for the reason given. */
    async abandon({ runId, token }: Claim, why: string): Promise<void> {
      await Run.update(
        {
          leaseUntil: sequelize.literal('NOW(3) - INTERVAL 1 SECOND') as unknown as Date,
          interruption: why.slice(0, 500),
        },
        { where: { id: runId, leaseOwner: token, state: 'running' } },
      );
    },

    /** One run whose lease ran out, locked for `mend`; false where there is none. */
    takeExpired: (
      mend: (runId: number, transaction: Transaction) => Promise<void>,
    ): Promise<boolean> =>
      sequelize.transaction(isolation, async (transaction) => {
        const id = await lockOne("state = 'running' AND lease_until < NOW(3)", transaction);
        if (id === null) return false;
        await mend(id, transaction);
        return true;
      }),
  };
}
