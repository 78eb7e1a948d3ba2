import type { RouteOptions } from './routeOptions';
import { RunCancelled } from './runErrors';

const STEPS_BETWEEN = 16;
const MS_BETWEEN_STOPS = 20;
const MS_BETWEEN_REPORTS = 100;

/** Tells the caller how far the run is and asks whether to stop. Nothing of it reaches the computation. */
export interface Polling {
  /** After a step */
  poll(time: number, steps: number): void;
  /** While the initial state settles */
  pollStart(): void;
  finish(time: number, steps: number): void;
}

export function createPolling(options: RouteOptions, duration: number): Polling {
  const { onProgress, shouldStop } = options;
  let askedAt = -Infinity;
  let reportedAt = -Infinity;

  function ask(time: number, steps: number): void {
    const now = performance.now();
    if (shouldStop && now - askedAt >= MS_BETWEEN_STOPS) {
      askedAt = now;
      if (shouldStop()) throw new RunCancelled(time);
    }
    if (onProgress && now - reportedAt >= MS_BETWEEN_REPORTS) {
      reportedAt = now;
      onProgress({ fraction: time / duration, time, steps });
    }
  }

  return {
    poll(time, steps) {
      if (steps % STEPS_BETWEEN === 0) ask(time, steps);
    },
    pollStart: () => ask(0, 0),
    finish(time, steps) {
      onProgress?.({ fraction: 1, time, steps });
    },
  };
}
