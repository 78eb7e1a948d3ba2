import { LEAST_SPREAD, type Parts } from '../geometry/parts';
import type { Workspace } from '../workspace';

const KINEMATIC = 2 / 3;
const BRAKED = 0.01;

/** As fastestWave.ts, of the waves of geometry/parts.ts. */
export function createPartedFastestWave(
  { n, dx, area, flow, celerity, friction }: Workspace,
  { flowArea, beta, spread }: Parts,
): () => number {
  const { abs, max, sqrt } = Math;

  return function fastestWave() {
    let fastest = 0;
    let sum = 0;
    for (let i = 1; i <= n; i++) {
      if (area[i] === 0) continue;
      const v = abs(flow[i]) / flowArea[i];
      const c2 = celerity[i] * celerity[i];
      let speed = beta[i] * v + sqrt(max(LEAST_SPREAD * c2, c2 + spread[i] * v * v));
      const isBraked = friction[i] * abs(flow[i]) * dx > BRAKED * v;
      if (isBraked) speed = max(speed, (1 + KINEMATIC) * v);
      if (speed > fastest) fastest = speed;
      sum += speed;
    }
    return sum < Infinity ? fastest : NaN;
  };
}
