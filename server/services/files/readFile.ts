import { AppError } from '../../errors';
import { ImportError } from '../../imports/importError';
import type { ImportResults, ImportTask } from '../../imports/importTasks';
import { readInWorker } from '../../imports/readInWorker';

/** A file as it was sent. */
export interface SentFile {
  name: string;
  bytes: Buffer;
}

/** Reads a sent file off the main thread; what cannot be read is answered in its own words. */
export async function readFile<K extends ImportTask['kind']>(
  file: SentFile,
  task: Extract<ImportTask, { kind: K }>,
): Promise<ImportResults[K]> {
  try {
    return await readInWorker<K>(file.bytes, task);
  } catch (error) {
    if (error instanceof ImportError) throw new AppError(error.code, error.message);
    throw error;
  }
}
