import { conflict } from '../../errors';
import type { ProgressHub } from '../../jobs/progressHub';
import { failureFields } from '../../models/failure';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import { SOLVER_VERSION } from '../../solvers';

interface Needs {
  hub: ProgressHub;
  /** Stops a run that is computed by this process. */
  stop: (runId: number) => void;
  /** A run waits in the queue. */
  queued: () => void;
}

/** Cancel and try again. Both throw `conflict` where the run is past it. */
export function buildChangeRuns({ audit, sequelize, models, now }: Platform, needs: Needs) {
  const locked = <T>(
    runId: number,
    action: 'run.cancelled' | 'run.retried',
    change: (run: RunModel) => Promise<T>,
  ): Promise<T> =>
    sequelize.transaction(async (transaction) => {
      const lock = transaction.LOCK.UPDATE;
      const run = await models.Run.findByPk(runId, { lock, transaction, rejectOnEmpty: true });
      const changed = await change(run);
      await run.save({ transaction });
      const words = `Run ${run.number} ${action === 'run.cancelled' ? 'cancelled' : 'put into the queue again'}`;
      await audit.note({ action, words, record: { kind: 'run', id: runId } }, transaction);
      return changed;
    });

  return {
    /** A queued run is cancelled at once, one that goes on within a second. */
    async cancel({ id }: RunModel): Promise<void> {
      const state = await locked(id, 'run.cancelled', async (run) => {
        if (run.state === 'queued') {
          run.set({ state: 'cancelled', finishedAt: now() });
        } else if (run.state === 'running') {
          run.cancelRequested = true;
        } else {
          throw conflict(`Run ${run.number} has ended already; there is nothing to cancel.`);
        }
        return run.state;
      });
      if (state === 'running') needs.stop(id);
      else needs.hub.publish(id, { type: 'ended', state });
    },

    /** The same frozen case once more, by the solver as it is now. */
    async retry({ id }: RunModel): Promise<void> {
      await locked(id, 'run.retried', async (run) => {
        if (run.state !== 'failed' && run.state !== 'cancelled') {
          throw conflict(
            `Run ${run.number} ${run.state === 'routed' ? 'is routed' : 'has not ended yet'}; ` +
              'only a run that failed or was cancelled can be tried again.',
          );
        }
        run.set({
          state: 'queued',
          progress: 0,
          secondsLeft: null,
          attempts: 0,
          cancelRequested: false,
          interruption: null,
          ...failureFields(null),
          startedAt: null,
          finishedAt: null,
          solverVersion: SOLVER_VERSION,
        });
      });
      needs.queued();
    },
  };
}
