import { existsSync } from 'node:fs';
import path from 'node:path';
import { Worker } from 'node:worker_threads';
import type { RunWorkerData, WorkerMessage, WorkerResult } from './workerMessages';

/** The thread ended without saying how the run ended. */
export interface Broken {
  type: 'broken';
  why: string;
}
export type Outcome = WorkerResult | Broken;

export interface RunningWorker {
  /** Resolves once, when the thread is gone; never rejects. */
  outcome: Promise<Outcome>;
  /** Asks the run to stop; ends the thread by force if it has not gone soon. */
  cancel(): void;
  /** Ends the thread by force. */
  kill(): Promise<void>;
}

/** A run polls its flag every few steps; one that does not is stuck. */
const GRACE_MILLISECONDS = 600;
/** The largest case that is accepted needs a quarter of it. */
const HEAP_MEGABYTES = 1024;

/** A small nursery is swept often: what hangs on its short-lived arrays would else stay for 80 MB longer. */
const YOUNG_MEGABYTES = 8;

/** The compiled entry beside the source where there is one. */
export function workerFile(directory: string, name: string): string {
  const compiled = path.join(directory, `${name}.js`);
  return existsSync(compiled) ? compiled : path.join(directory, `${name}.ts`);
}

/** How a thread reads its entry: TypeScript through tsx, as this process does. */
export const workerOptions = (file: string) => ({
  execArgv: file.endsWith('.ts') ? ['--require', 'tsx/cjs'] : [],
});

export const RUN_WORKER = workerFile(__dirname, 'runWorker');

export function startWorker(
  file: string,
  caseBytes: Uint8Array,
  onProgress: (progress: Extract<WorkerMessage, { type: 'progress' }>) => void,
  heapMegabytes = HEAP_MEGABYTES,
): RunningWorker {
  const stopFlag = new SharedArrayBuffer(4);
  const worker = new Worker(file, {
    workerData: { caseBytes, stopFlag } satisfies RunWorkerData,
    ...workerOptions(file),
    resourceLimits: {
      maxOldGenerationSizeMb: heapMegabytes,
      maxYoungGenerationSizeMb: YOUNG_MEGABYTES,
    },
  });
  let cancelled = false;
  let force: NodeJS.Timeout | undefined;

  const outcome = new Promise<Outcome>((resolve) => {
    let told: WorkerResult | undefined;
    let why: string | undefined;
    worker.on('message', (message: WorkerMessage) => {
      if (message.type === 'progress') onProgress(message);
      else told = message;
    });
    worker.on('error', (error) => (why = wordsOf(error)));
    worker.on('exit', (code) => {
      clearTimeout(force);
      if (told) resolve(told);
      else if (cancelled) resolve({ type: 'cancelled' });
      else resolve({ type: 'broken', why: why ?? `its thread ended with code ${code}` });
    });
  });

  return {
    outcome,
    cancel() {
      if (cancelled) return;
      cancelled = true;
      Atomics.store(new Int32Array(stopFlag), 0, 1);
      force = setTimeout(() => void worker.terminate(), GRACE_MILLISECONDS);
    },
    async kill() {
      await worker.terminate();
    },
  };
}

function wordsOf(error: unknown): string {
  const { code, message } = error as { code?: string; message?: string };
  if (code === 'ERR_WORKER_OUT_OF_MEMORY') return 'it needed more memory than a run may take';
  return message ?? String(error);
}
