import type { Logger } from 'pino';
import type { TaskSetKind } from '../../../shared/tasks/types';
import type { QueueTiming } from '../timing';
import { taskPool, type RunningTask, type TaskOutcome } from './taskPool';
import type { TaskClaim, TaskEnding, TaskQueue } from './taskQueue';

interface Parts {
  queue: TaskQueue;
  log: Logger;
  timing: QueueTiming;
  /** How many are computed at once, runs and tasks together; 0: this process computes none. */
  slots: number;
  /** Slots that runs take at this moment. */
  busyRuns: () => number;
  /** Whether the kind makes one result of those of its members. */
  gathers: (kind: TaskSetKind) => boolean;
  /** Entry of the worker threads. */
  workerFile: string;
}

interface Active {
  claim: TaskClaim;
  task: RunningTask;
  /** Settles when the task has left this process. */
  done: Promise<void>;
}

export type TaskDispatcher = ReturnType<typeof taskDispatcher>;

/** How often a result is tried to be stored when the database does not answer. */
const STORE_TRIES = 4;

/**
 * Takes tasks while there are slots that no run needs, watches over them, and writes how they end. A run that comes meanwhile
 * waits for none of them: it begins beside the task, and no further task is taken until there is room again.
 */
export function taskDispatcher(parts: Parts) {
  const { queue, log, timing, slots, busyRuns, gathers, workerFile } = parts;
  const active = new Map<string, Active>();
  const pool = taskPool(workerFile, Math.max(1, slots));
  let timer: NodeJS.Timeout | undefined;
  let stopping = false;
  let round: Promise<void> | null = null;
  let again = false;

  async function begin(claim: TaskClaim): Promise<void> {
    const task = pool.begin(await queue.read(claim));
    const done = task.outcome
      .then(async (outcome) => {
        await keepNotes(claim, task);
        await end(claim, outcome);
      })
      .catch(async (error: unknown) => {
        log.error({ err: error, taskId: claim.taskId }, 'task not stored');
        await queue
          .abandon(claim, 'its result could not be stored in the database')
          .catch(() => log.error({ taskId: claim.taskId }, 'task left to the end of its lease'));
      })
      .finally(() => {
        active.delete(claim.token);
        wake();
      });
    active.set(claim.token, { claim, task, done });
  }

  async function keepNotes(claim: TaskClaim, task: RunningTask): Promise<void> {
    const notes = task.takeNotes();
    if (notes) await queue.note(claim, notes);
  }

  async function end(claim: TaskClaim, outcome: TaskOutcome): Promise<void> {
    const { taskId } = claim;
    if (outcome.type === 'broken') {
      if (stopping) return queue.release(claim);
      log.warn({ taskId, why: outcome.why }, 'task broken off');
      return queue.abandon(claim, outcome.why);
    }
    if (outcome.type === 'failed' && outcome.fault)
      log.error({ taskId, fault: outcome.fault }, 'task failed by a fault of the program');
    const ending = endingOf(outcome);
    for (let attempt = 1; ; attempt++) {
      try {
        await queue.finish(claim, ending);
        return;
      } catch (error) {
        if (attempt === STORE_TRIES) throw error;
        log.warn({ err: error, attempt }, 'storing a task failed, trying again');
        await new Promise((resolve) => setTimeout(resolve, 200 * 2 ** attempt));
      }
    }
  }

  async function renewAll(): Promise<void> {
    for (const { claim, task } of [...active.values()]) {
      await keepNotes(claim, task);
      if (!(await queue.renew(claim, task.progress()))) task.cancel();
    }
  }

  async function fill(): Promise<void> {
    while (!stopping && active.size + busyRuns() < slots) {
      const claim = await queue.claim();
      if (!claim) return;
      await begin(claim);
    }
  }

  /** One look at the queue. Never two at once; one more where it was asked for meanwhile. */
  function wake(): void {
    if (stopping || !timer) return;
    again = true;
    round ??= (async () => {
      while (again && !stopping) {
        again = false;
        await renewAll();
        for (const taskId of await queue.recover()) log.warn({ taskId }, 'task recovered');
        for (const setId of await queue.conclude(gathers)) log.info({ setId }, 'task set ended');
        await fill();
      }
    })()
      .catch((error: unknown) => log.error({ err: error }, 'the queue of tasks could not be read'))
      .finally(() => (round = null));
  }

  return {
    start(): void {
      if (slots === 0 || timer) return;
      timer = setInterval(wake, timing.beat);
      wake();
    },
    /** Something was put into the queue: do not wait for the next beat. */
    wake,
    /** Stops what is computed here of a set at once; others see it in the database at their next beat. */
    cancel(setId: number): void {
      for (const { claim, task } of active.values()) if (claim.setId === setId) task.cancel();
    },
    /** Ends the worker threads and puts their tasks back into the queue. */
    async stop(): Promise<void> {
      stopping = true;
      clearInterval(timer);
      await round;
      const ending = [...active.values()];
      for (const { task } of ending) task.kill();
      await Promise.all(ending.map(({ done }) => done));
      await pool.stop();
    },
  };
}

function endingOf(outcome: Exclude<TaskOutcome, { type: 'broken' }>): TaskEnding {
  switch (outcome.type) {
    case 'finished':
      return { state: 'finished', result: outcome.result };
    case 'failed':
      return { state: 'failed', failure: outcome.reason };
    case 'cancelled':
      return { state: 'cancelled' };
  }
}
