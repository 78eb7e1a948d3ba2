import { parentPort, workerData } from 'node:worker_threads';
import { ImportError } from './importError';
import type { ImportAnswer, ImportResults, ImportTask } from './importTasks';
import { readMarkFile } from './marks/readMarkFile';
import { readSurvey } from './survey/readSurvey';
import { readTable } from './tables/readTable';

/** Entry of the worker thread: one file, one answer, then the thread ends and takes with it whatever the file did to it. */
const { bytes, task } = workerData as { bytes: Uint8Array; task: ImportTask };

parentPort!.postMessage(answer());

function answer(): ImportAnswer {
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  try {
    return { ok: true, reading: read(buffer) };
  } catch (error) {
    if (error instanceof ImportError)
      return { ok: false, code: error.code, message: error.message };
    return { ok: false, code: 'internal', message: String((error as Error)?.stack ?? error) };
  }
}

function read(buffer: Buffer): ImportResults[keyof ImportResults] {
  switch (task.kind) {
    case 'survey':
      return readSurvey(buffer, task.options);
    case 'table':
      return readTable(buffer, task.options.fileName, task.options);
    case 'marks':
      return readMarkFile(buffer, task.options.fileName, task.options);
  }
}
