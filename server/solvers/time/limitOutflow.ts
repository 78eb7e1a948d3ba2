import type { Workspace } from '../workspace';

/**
 * Where a cell would give away more water in `dt` (s) than it has, scales its outgoing volume fluxes to what is there.
 * What one cell does not give its neighbour does not get, so that volume is kept.
 */
export function createLimitOutflow(workspace: Workspace): (dt: number) => void {
  const { n, dx, area, fluxArea } = workspace;

  return function limitOutflow(dt) {
    const toFlow = dx / dt;
    for (let i = 1; i <= n; i++) {
      const left = fluxArea[i - 1];
      const right = fluxArea[i];
      const out = (right > 0 ? right : 0) - (left < 0 ? left : 0);
      const held = area[i] * toFlow;
      if (out <= held) continue;
      const share = held / out;
      if (right > 0) fluxArea[i] = right * share;
      if (left < 0) fluxArea[i - 1] = left * share;
    }
  };
}
