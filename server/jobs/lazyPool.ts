import Piscina from 'piscina';
import type { Platform } from '../platform';
import { workerFile, workerOptions } from './startWorker';

const IDLE_MILLISECONDS = 30_000;
const HEAP_MEGABYTES = 2048;
const WAITING = 20;

/** One worker thread for heavy files, one task at a time, begun when it is first needed and let go when it is idle. */
export function lazyPool<Task, Answer>(
  { onClose }: Pick<Platform, 'onClose'>,
  directory: string,
  name: string,
): () => Piscina<Task, Answer> {
  let threads: Piscina<Task, Answer> | undefined;
  onClose(() => threads?.destroy());
  return () => {
    const file = workerFile(directory, name);
    threads ??= new Piscina<Task, Answer>({
      ...workerOptions(file),
      filename: file,
      minThreads: 0,
      maxThreads: 1,
      maxQueue: WAITING,
      idleTimeout: IDLE_MILLISECONDS,
      resourceLimits: { maxOldGenerationSizeMb: HEAP_MEGABYTES },
    });
    return threads;
  };
}
