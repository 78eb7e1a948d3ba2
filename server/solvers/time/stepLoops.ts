import type { CellState } from '../geometry/cellState';
import type { Laterals } from '../sources/laterals';
import type { Workspace } from '../workspace';

/** Largest explicit part of friction, in parts of the flow: keeps a strongly braked flow from turning back. */
const MOST_EXPLICIT = 0.25;

/** The halves of a step for all cells, from the fluxes in the workspace; see steps.ts for the method. */
export interface StepLoops {
  predict(dt: number): void;
  /** Returns how many cells lost more than half of their water. */
  correct(dt: number): number;
}

/** What came from the side in the last half is left in `workspace.lateralSums`: m³/s taken, and wanted but not there. */
export function createStepLoops(
  workspace: Workspace,
  cellState: CellState,
  laterals: Laterals,
): StepLoops {
  const { n, dx, area, flow, stage, bed, dryDepth, friction, lateralSums } = workspace;
  const { fluxArea, fluxLeft, fluxRight, oldArea, halfFlow, implicitShare } = workspace;
  const { follow } = cellState;
  const { rate } = laterals;
  const { abs, min, sqrt } = Math;
  const hasLaterals = laterals.any;

  /** Area of cell i after what comes from the side in `dt`; counts what was moved. */
  function withLateral(i: number, a: number, dt: number): number {
    const wanted = (dt * rate[i]) / dx;
    const taken = wanted < -a ? -a : wanted;
    lateralSums[0] += (taken * dx) / dt;
    lateralSums[1] += ((taken - wanted) * dx) / dt;
    return a + taken;
  }

  function predict(dt: number): void {
    const ratio = dt / dx;
    const fourDt = 4 * dt;
    lateralSums[0] = 0;
    lateralSums[1] = 0;
    for (let i = 1; i <= n; i++) {
      const old = area[i];
      const q0 = flow[i];
      oldArea[i] = old;
      let a = old - ratio * (fluxArea[i] - fluxArea[i - 1]);
      let q = q0 - ratio * (fluxLeft[i] - fluxRight[i - 1]);
      if (a < 0) a = 0;
      if (hasLaterals && rate[i] !== 0) {
        const before = a;
        a = withLateral(i, a, dt);
        if (a < before) {
          if (a > 0.5 * before && old > 0) q += ((a - before) * q0) / old;
          else q *= a / before;
        }
      }
      const half = 0.5 * dt * friction[i] * abs(q0);
      const e = min(half, MOST_EXPLICIT);
      implicitShare[i] = half < MOST_EXPLICIT ? 0.5 : 1 - (0.5 * MOST_EXPLICIT) / half;
      halfFlow[i] = 0.5 * (q0 + q) - e * q0;
      if (a !== old) {
        area[i] = a;
        follow(i);
      }
      flow[i] =
        stage[i] - bed[i] > dryDepth ? (2 * q) / (1 + sqrt(1 + fourDt * friction[i] * abs(q))) : 0;
    }
  }

  function correct(dt: number): number {
    const ratio = dt / dx;
    const fourDt = 4 * dt;
    lateralSums[0] = 0;
    lateralSums[1] = 0;
    let drained = 0;
    for (let i = 1; i <= n; i++) {
      const old = oldArea[i];
      let a = area[i] - ratio * (fluxArea[i] - fluxArea[i - 1]);
      let q = halfFlow[i] - 0.5 * ratio * (fluxLeft[i] - fluxRight[i - 1]);
      if (a < 0) a = 0;
      if (hasLaterals && rate[i] !== 0) {
        const before = a;
        a = withLateral(i, a, dt);
        if (a < before) {
          if (a > 0.5 * before && area[i] > 0) q += (0.5 * (a - before) * flow[i]) / area[i];
          else q *= (old + a) / (old + before);
        }
      }
      a = 0.5 * (old + a);
      if (a !== area[i]) {
        area[i] = a;
        follow(i);
      }
      const m = fourDt * implicitShare[i] * friction[i];
      flow[i] = stage[i] - bed[i] > dryDepth ? (2 * q) / (1 + sqrt(1 + m * abs(q))) : 0;
      if (a < 0.5 * old) drained++;
    }
    return drained;
  }

  return { predict, correct };
}
