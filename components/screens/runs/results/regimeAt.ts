import type { RunStructure } from '@/shared/runs/types';

type Regimes = RunStructure['regimes'];

/** How the water passes at a time, s. */
export function regimeAt(regimes: Regimes, t: number): Regimes[number] {
  let now = regimes[0];
  for (const change of regimes) if (change.time <= t) now = change;
  return now;
}
