import type { Kernel } from '../kernel';
import { RunFailed } from '../runErrors';
import type { Laterals } from '../sources/laterals';
import type { Workspace } from '../workspace';
import type { CellTables } from '../geometry/cellTables';

/** No river flows so fast (m/s): a state that does has left the equations. */
const IMPOSSIBLE = 1000;

/**
 * The largest stable step (s) of the present state: courant dx / max(|u| + c), over cells, ends (`endSpeed`, m/s) and
 * what lateral inflow onto dry ground will start with. Throws RunFailed where the state is not finite.
 */
export function createTimeStep(
  workspace: Workspace,
  kernel: Kernel,
  tables: CellTables,
  laterals: Laterals,
  courant: number,
  chainage: Float64Array,
): (endSpeed: number, time: number) => number {
  const { n, dx, area, flow, celerity, bed, gravity } = workspace;
  const { abs } = Math;
  let lateralSpeed = 0;
  for (let i = 1; i <= n; i++) {
    if (laterals.largest[i] === 0) continue;
    const width = tables.widthAt(i, bed[i] + 0.1);
    lateralSpeed = Math.max(lateralSpeed, Math.cbrt((gravity * laterals.largest[i]) / width));
  }

  function fail(time: number): never {
    let worst = 1;
    let fastest = 0;
    for (let i = 1; i <= n; i++) {
      const speed = area[i] > 0 ? abs(flow[i]) / area[i] + celerity[i] : 0;
      if (speed <= fastest) continue;
      fastest = speed;
      worst = i;
      if (!(speed < IMPOSSIBLE) || !(area[i] >= 0)) break;
    }
    throw new RunFailed(
      'the velocity grew beyond any that water can have. Check the sections and the roughness there for a ' +
        'mistaken elevation or unit, then try smaller cells or a smaller Courant number',
      time,
      chainage[worst - 1],
    );
  }

  return function timeStep(endSpeed, time) {
    const fastest = Math.max(endSpeed, lateralSpeed, kernel.fastestWave());
    if (!(fastest < IMPOSSIBLE)) fail(time);
    return fastest > 0 ? (courant * dx) / fastest : Infinity;
  };
}
