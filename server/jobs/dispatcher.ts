import type { Logger } from 'pino';
import type { RunEvent, RunState } from '../../shared/runs/types';
import type { Models } from '../models';
import type { ProgressHub } from './progressHub';
import type { Claim, Ending, RunQueue } from './queue';
import { recoverExpired } from './recovery';
import { secondsLeft } from './secondsLeft';
import { startWorker, type Outcome, type RunningWorker } from './startWorker';
import type { QueueTiming } from './timing';

interface Parts {
  queue: RunQueue;
  models: Models;
  hub: ProgressHub;
  log: Logger;
  timing: QueueTiming;
  /** How many runs are computed at once; 0: this process computes none. */
  slots: number;
  /** Entry of the worker threads. */
  workerFile: string;
}

interface Active {
  claim: Claim;
  worker: RunningWorker;
  progress: number;
  secondsLeft: number | null;
  /** Settles when the run has left this process. */
  done: Promise<void>;
}

export type RunDispatcher = ReturnType<typeof runDispatcher>;

/** How often the results of a finished run are tried to be stored when the database does not answer. */
const STORE_TRIES = 4;

/** Takes runs from the queue while there are free slots, watches over their worker threads, and writes how they end. */
export function runDispatcher(parts: Parts) {
  const { queue, models, hub, log, timing, slots, workerFile } = parts;
  /** By the token of the claim: a run that was lost and taken again is another one. */
  const active = new Map<string, Active>();
  let timer: NodeJS.Timeout | undefined;
  let stopping = false;
  let round: Promise<void> | null = null;
  let again = false;

  const publishState = (runId: number, state: RunState) =>
    hub.publish(runId, {
      type: 'progress',
      state,
      progress: 0,
      secondsLeft: null,
      time: 0,
      surface: null,
    });
  const publishEnd = (runId: number, state: RunState) =>
    hub.publish(runId, { type: 'ended', state });

  function begin(claim: Claim): void {
    const { runId } = claim;
    const left = secondsLeft(Date.now());
    const worker = startWorker(workerFile, claim.caseBytes, ({ fraction, time, surface }) => {
      entry.progress = fraction;
      entry.secondsLeft = left(fraction, Date.now());
      const event: RunEvent = {
        type: 'progress',
        state: 'running',
        progress: fraction,
        secondsLeft: entry.secondsLeft,
        time,
        surface: surface && {
          chainages: surface.chainages,
          bed: surface.bed,
          stage: surface.stage,
        },
      };
      hub.publish(runId, event);
    });
    const entry: Active = {
      claim,
      worker,
      progress: 0,
      secondsLeft: null,
      done: worker.outcome
        .then((outcome) => end(claim, outcome))
        .catch((error: unknown) => notStored(claim, error))
        .finally(() => {
          active.delete(claim.token);
          if (!stopping) wake();
        }),
    };
    active.set(claim.token, entry);
    publishState(runId, 'running');
    log.info({ runId, attempt: claim.attempts }, 'run begun');
  }

  async function end(claim: Claim, outcome: Outcome): Promise<void> {
    const { runId } = claim;
    if (outcome.type === 'broken') {
      if (stopping) return queue.release(claim);
      log.warn({ runId, why: outcome.why }, 'run broken off');
      return queue.abandon(claim, outcome.why);
    }
    const ending = endingOf(outcome);
    const stored = await persist(() => queue.finish(claim, ending));
    log.info({ runId, state: ending.state, stored }, 'run ended');
    if (!stored) return hub.forget(runId);
    const run = await models.Run.findByPk(runId, { attributes: ['state'] });
    if (run) publishEnd(runId, run.state);
  }

  async function persist(store: () => Promise<boolean>): Promise<boolean> {
    for (let attempt = 1; ; attempt++) {
      try {
        return await store();
      } catch (error) {
        if (attempt === STORE_TRIES) throw error;
        log.warn({ err: error, attempt }, 'storing a run failed, trying again');
        await new Promise((resolve) => setTimeout(resolve, 200 * 2 ** attempt));
      }
    }
  }

  /** Not the fault of the run: it is begun again, at most twice. */
  async function notStored(claim: Claim, error: unknown): Promise<void> {
    const { runId } = claim;
    log.error({ err: error, runId }, 'run not stored');
    await queue
      .abandon(claim, 'its results could not be stored in the database')
      .catch(() => log.error({ runId }, 'run left to the end of its lease'));
  }

  async function renewAll(): Promise<void> {
    for (const { claim, worker, progress, secondsLeft: left } of [...active.values()]) {
      const standing = await queue.renew(claim, progress, left);
      // A lost run is somebody else's: stop computing it; what it tells will not be stored.
      if (standing !== 'held') worker.cancel();
    }
  }

  async function recover(): Promise<void> {
    for (const { runId, state } of await recoverExpired(queue, models)) {
      log.warn({ runId, state }, 'run recovered');
      if (state === 'queued') publishState(runId, state);
      else publishEnd(runId, state);
    }
  }

  async function fill(): Promise<void> {
    while (!stopping && active.size < slots) {
      const claim = await queue.claim();
      if (!claim) return;
      begin(claim);
    }
  }

  /** One look at the queue. Never two at once; one more where it was asked for meanwhile. */
  function wake(): void {
    if (stopping) return;
    again = true;
    round ??= (async () => {
      while (again && !stopping) {
        again = false;
        await renewAll();
        await recover();
        await fill();
      }
    })()
      .catch((error: unknown) => log.error({ err: error }, 'the queue could not be read'))
      .finally(() => (round = null));
  }

  return {
    /** Slots that are taken. */
    busy: (): number => active.size,
    start(): void {
      if (slots === 0 || timer) return;
      timer = setInterval(wake, timing.beat);
      wake();
    },
    /** A run was put into the queue: do not wait for the next beat. */
    wake(): void {
      if (timer) wake();
    },
    /** Stops a run that is computed here at once; others see the mark in the database at their next beat. */
    cancel(runId: number): void {
      for (const { claim, worker } of active.values()) {
        if (claim.runId === runId) worker.cancel();
      }
    },
    /** Ends the worker threads and puts their runs back into the queue. */
    async stop(): Promise<void> {
      stopping = true;
      clearInterval(timer);
      await round;
      const ending = [...active.values()];
      await Promise.all(ending.map(({ worker }) => worker.kill()));
      await Promise.all(ending.map(({ done }) => done));
    },
  };
}

function endingOf(outcome: Exclude<Outcome, { type: 'broken' }>): Ending {
  switch (outcome.type) {
    case 'routed': {
      const { blocks, solver, peakStage, peakFlow, inflow } = outcome;
      return { state: 'routed', blocks, solver, peakStage, peakFlow, inflow };
    }
    case 'failed':
      return { state: 'failed', failure: outcome.reason };
    case 'cancelled':
      return { state: 'cancelled' };
  }
}
