import type { Models } from '../models';
import { failureFields } from '../models/failure';
import type { RunQueue } from './queue';
import { MAX_ATTEMPTS } from './timing';

/** A run that recovery moved, and to where. */
export interface Recovered {
  runId: number;
  state: 'queued' | 'cancelled' | 'failed';
  failure: string | null;
}

/**
 * Runs whose worker or server is gone go back into the queue by themselves, at most twice; then they fail and say why.
 * A run that was to be cancelled is cancelled.
 */
export async function recoverExpired(queue: RunQueue, { Run }: Models): Promise<Recovered[]> {
  const recovered: Recovered[] = [];
  const takeOne = () =>
    queue.takeExpired(async (runId, transaction) => {
      const run = (await Run.findByPk(runId, { transaction }))!;
      const ended = run.cancelRequested || run.attempts >= MAX_ATTEMPTS;
      const state = run.cancelRequested ? 'cancelled' : ended ? 'failed' : 'queued';
      const failure = state === 'failed' ? reason(run.attempts, run.interruption) : null;
      await run.update(
        {
          state,
          ...failureFields(failure === null ? null : { message: failure }),
          progress: state === 'queued' ? 0 : run.progress,
          secondsLeft: null,
          leaseOwner: null,
          leaseUntil: null,
          finishedAt: ended ? new Date() : null,
        },
        { transaction },
      );
      recovered.push({ runId, state, failure });
    });
  while (await takeOne());
  return recovered;
}

function reason(attempts: number, interruption: string | null): string {
  const why = interruption ?? 'the server stopped while it was running';
  return (
    `The run was begun ${attempts} times and broke off each time, the last time because ${why}. ` +
    'Nothing of it was stored. Try it again; if it breaks off once more, use larger cells or fewer output times, ' +
    'and tell whoever runs the server.'
  );
}
