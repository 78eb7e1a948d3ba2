import { RunFailed } from '../runErrors';
import type { Laterals } from '../sources/laterals';
import type { Workspace } from '../workspace';
import type { CellTables } from '../geometry/cellTables';

/** No river flows so fast (m/s): a state that does has left the equations. */
const IMPOSSIBLE = 1000;

/** Friction makes waves of celerity 5u/3 (Manning, wide section), which beyond Froude 1.5 outrun u + c. */
const KINEMATIC = 2 / 3;
/** … where friction takes more than this share of the momentum over a cell. */
const BRAKED = 0.01;

/**
 * The largest stable step (s) of the present state: courant dx / max(|u| + c), over cells, ends (`endSpeed`, m/s) and
 * what lateral inflow onto dry ground will start with. Throws RunFailed where the state is not finite.
 */
export function createTimeStep(
  workspace: Workspace,
  tables: CellTables,
  laterals: Laterals,
  courant: number,
  chainage: Float64Array,
): (endSpeed: number, time: number) => number {
  const { n, dx, area, flow, celerity, friction, bed, gravity } = workspace;
  const { abs } = Math;
  let lateralSpeed = 0;
  for (let i = 1; i <= n; i++) {
    if (laterals.largest[i] === 0) continue;
    const width = tables.widthAt(i, bed[i] + 0.1);
    lateralSpeed = Math.max(lateralSpeed, Math.cbrt((gravity * laterals.largest[i]) / width));
  }

  function fail(time: number): never {
    let worst = 1;
    for (let i = 1; i <= n; i++) {
      const speed = area[i] > 0 ? abs(flow[i]) / area[i] + celerity[i] : 0;
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
    let fastest = Math.max(endSpeed, lateralSpeed);
    let sum = fastest;
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
    if (!(fastest < IMPOSSIBLE) || !(sum < Infinity)) fail(time);
    return fastest > 0 ? (courant * dx) / fastest : Infinity;
  };
}
