import type { Logger } from 'pino';

/** Work that an answer does not wait for. What fails is logged; closing waits for what is under way. */
export interface Background {
  run: (name: string, task: () => Promise<unknown>) => void;
  /** Resolves when nothing is under way. */
  idle: () => Promise<void>;
}

export function buildBackground(log: Logger): Background {
  const underWay = new Set<Promise<unknown>>();
  return {
    run: (name, task) => {
      const work = task()
        .catch((error: unknown) => log.error({ err: error }, `${name} failed`))
        .finally(() => underWay.delete(work));
      underWay.add(work);
    },
    idle: async () => {
      while (underWay.size > 0) await Promise.all(underWay);
    },
  };
}
