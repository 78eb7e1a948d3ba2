import type { Workspace } from '../workspace';

/** Of what waves carry, A c, in the largest section */
const STILL = 1e-4;

/** A flow (m³/s) below which the present water counts as still: what lasts of a swell in a pool is no flow. */
export function stillFlow({ n, area, celerity }: Workspace): number {
  let most = 0;
  for (let i = 1; i <= n; i++) most = Math.max(most, area[i] * celerity[i]);
  return STILL * most;
}
