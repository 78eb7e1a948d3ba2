import { MessageChannel } from 'node:worker_threads';
import Piscina from 'piscina';
import { workerFile, workerOptions } from '../startWorker';
import type { StoredWork, TaskAnswer, TaskWork } from './taskMessages';

export const TASK_WORKER = workerFile(__dirname, 'taskWorker');

/** The thread ended without an answer. */
export interface Broken {
  type: 'broken';
  why: string;
}
export type TaskOutcome = TaskAnswer | Broken;

export interface RunningTask {
  /** Settles once; never rejects. */
  outcome: Promise<TaskOutcome>;
  /** 0..1 */
  progress: () => number;
  /** What it kept since this was last asked; null: nothing new. */
  takeNotes: () => Uint8Array | null;
  /** Asks the task to stop; ends its thread by force if it has not stopped soon. */
  cancel: () => void;
  kill: () => void;
}

/** A task polls its flag; one that does not is stuck. */
const GRACE_MILLISECONDS = 1500;
const IDLE_MILLISECONDS = 60_000;
const HEAP_MEGABYTES = 1024;
/** Sets take hours and nobody waits for one member: pages and runs go before them where the system can tell threads apart. */
const NICE = 10;

/** Threads that stay from task to task: to start one a member would take longer than many a member. */
export function taskPool(file: string, threads: number) {
  let pool: Piscina<TaskWork, TaskAnswer> | undefined;
  const started = () =>
    (pool ??= new Piscina<TaskWork, TaskAnswer>({
      ...workerOptions(file),
      filename: file,
      minThreads: 0,
      maxThreads: threads,
      idleTimeout: IDLE_MILLISECONDS,
      niceIncrement: NICE,
      resourceLimits: { maxOldGenerationSizeMb: HEAP_MEGABYTES },
    }));

  return {
    begin(work: StoredWork): RunningTask {
      const shared = new SharedArrayBuffer(16);
      const { port1: notes, port2: notebook } = new MessageChannel();
      let latest: Uint8Array | null = null;
      notes.on('message', (kept: Uint8Array) => void (latest = kept));
      notes.unref();
      const force = new AbortController();
      let asked = false;
      let timer: NodeJS.Timeout | undefined;
      const outcome = started()
        .run({ ...work, shared, notebook }, { signal: force.signal, transferList: [notebook] })
        .catch((error: unknown): TaskOutcome =>
          asked ? { type: 'cancelled' } : { type: 'broken', why: wordsOf(error) },
        )
        .finally(() => {
          clearTimeout(timer);
          notes.close();
        });
      return {
        outcome,
        progress: () => new Float64Array(shared, 8, 1)[0],
        takeNotes() {
          const taken = latest;
          latest = null;
          return taken;
        },
        cancel() {
          if (asked) return;
          asked = true;
          Atomics.store(new Int32Array(shared, 0, 1), 0, 1);
          timer = setTimeout(() => force.abort(), GRACE_MILLISECONDS);
        },
        kill: () => force.abort(),
      };
    },
    stop: async (): Promise<void> => pool?.destroy(),
  };
}

function wordsOf(error: unknown): string {
  const { code, message } = error as { code?: string; message?: string };
  if (code === 'ERR_WORKER_OUT_OF_MEMORY') return 'it needed more memory than a task may take';
  return message ?? String(error);
}
