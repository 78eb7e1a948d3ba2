import os from 'node:os';
import type { Env } from '../env';

/** How much is computed at once: one core stays free for the server itself. */
export const workerSlots = ({ workers }: Pick<Env, 'workers'>): number =>
  workers ?? Math.max(1, os.availableParallelism() - 1);
