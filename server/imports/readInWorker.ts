import { existsSync } from 'node:fs';
import path from 'node:path';
import { Worker } from 'node:worker_threads';
import { LIMITS } from '../../shared/limits';
import { ImportError, tooLarge } from './importError';
import type { ImportAnswer, ImportResults, ImportTask } from './importTasks';

/** Files read at once, and waiting: a thread each, so that none can hold up the server or another firm's file for long. */
const AT_ONCE = 2;
const WAITING = 20;
/** What a file may make of the thread's memory, MB. */
const HEAP_MB = 768;

export interface ImportLimits {
  seconds: number;
  heapMb: number;
}
const USUAL: ImportLimits = { seconds: LIMITS.upload.parseSeconds, heapMb: HEAP_MB };

const COMPILED = path.join(__dirname, 'importWorker.js');
const WORKER = existsSync(COMPILED) ? COMPILED : path.join(__dirname, 'importWorker.ts');

let running = 0;
const waiting: (() => void)[] = [];

/**
 * Reads a file in a thread of its own with bounded time and memory. The thread ends with the file, so that nothing a hostile
 * file does to it outlives it. Throws an ImportError (`unreadable`, `tooLarge`, `timeout`); anything else is a fault of ours.
 */
export async function readInWorker<K extends ImportTask['kind']>(
  bytes: Uint8Array,
  task: Extract<ImportTask, { kind: K }>,
  limits: ImportLimits = USUAL,
): Promise<ImportResults[K]> {
  await takeTurn();
  try {
    const answer = await runThread(bytes, task, limits);
    if (answer.ok) return answer.reading as ImportResults[K];
    if (answer.code === 'internal') throw new Error(`Reading a file failed: ${answer.message}`);
    throw new ImportError(answer.code, answer.message);
  } finally {
    running--;
    waiting.shift()?.();
  }
}

async function takeTurn(): Promise<void> {
  if (running >= AT_ONCE) {
    if (waiting.length >= WAITING)
      throw new ImportError(
        'timeout',
        'Many files are being read right now. Send it again in a minute.',
      );
    await new Promise<void>((resolve) => waiting.push(resolve));
  }
  running++;
}

function runThread(bytes: Uint8Array, task: ImportTask, limits: ImportLimits) {
  return new Promise<ImportAnswer>((resolve, reject) => {
    const worker = new Worker(WORKER, {
      workerData: { bytes, task },
      execArgv: WORKER.endsWith('.ts') ? ['--require', 'tsx/cjs'] : [],
      resourceLimits: { maxOldGenerationSizeMb: limits.heapMb },
      env: { NODE_ENV: process.env.NODE_ENV },
    });
    const clock = setTimeout(() => {
      finish(() =>
        reject(
          new ImportError(
            'timeout',
            `The file takes longer than ${limits.seconds} seconds to read. Send the sections alone, in a plain table.`,
          ),
        ),
      );
      void worker.terminate();
    }, limits.seconds * 1000);
    let settled = false;
    const finish = (settle: () => void) => {
      if (settled) return;
      settled = true;
      clearTimeout(clock);
      settle();
    };
    worker.once('message', (answer: ImportAnswer) => finish(() => resolve(answer)));
    worker.once('error', (error: NodeJS.ErrnoException) =>
      finish(() => reject(error.code === 'ERR_WORKER_OUT_OF_MEMORY' ? TOO_BIG() : error)),
    );
    worker.once('exit', (code) =>
      finish(() => reject(new Error(`The thread that read a file ended with ${code}.`))),
    );
  });
}

const TOO_BIG = () =>
  tooLarge(
    'The file holds more than can be read at once. Send the sections alone, without spare sheets.',
  );
