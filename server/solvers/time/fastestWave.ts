import type { Workspace } from '../workspace';

/** Friction makes waves of celerity 5u/3 (Manning, wide section), which beyond Froude 1.5 outrun u + c. */
const KINEMATIC = 2 / 3;
/** … where friction takes more than this share of the momentum over a cell. */
const BRAKED = 0.01;

/** The fastest wave of all cells (m/s): |u| + c, or 5|u|/3 where friction holds shooting flow; NaN where one is not finite. */
export function createFastestWave(workspace: Workspace): () => number {
  const { n, dx, area, flow, celerity, friction } = workspace;
  const { abs } = Math;

  return function fastestWave() {
    let fastest = 0;
    let sum = 0;
    for (let i = 1; i <= n; i++) {
      const a = area[i];
      if (a !== 0) {
        const u = abs(flow[i]) / a;
        const c = celerity[i];
        let speed = u + c;
        const isShooting = c < KINEMATIC * u && friction[i] * abs(flow[i]) * dx > BRAKED * u;
        if (isShooting) speed = (1 + KINEMATIC) * u;
        if (speed > fastest) fastest = speed;
        sum += speed;
      }
    }
    // A sum that is not finite tells of one term that is not, which no comparison above does.
    return sum < Infinity ? fastest : NaN;
  };
}
