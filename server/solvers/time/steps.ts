import type { VolumeLedger } from '../diagnostics/volumeLedger';
import type { CellState } from '../geometry/cellState';
import type { Laterals } from '../sources/laterals';
import type { Workspace } from '../workspace';
import { createLimitOutflow } from './limitOutflow';

/** Largest explicit part of friction, in parts of the flow: keeps a strongly braked flow from turning back. */
const MOST_EXPLICIT = 0.25;

/**
 * Both halves of a step of the second-order strong-stability-preserving Runge-Kutta method (Heun; Shu and Osher 1988,
 * J. Comput. Phys. 77, 439-471). Each uses the fluxes in the workspace.
 *
 * Friction -k Q|Q|, k = g/(A V²), is implicit in the predictor, and trapezoidal in the step as a whole with less
 * explicit part the stiffer it is: with z = dt k|Q| at the start, e = min(z/2, 1/4), R the mean of both fluxes,
 *   Q' + (1 - e/z) dt k' Q'|Q'| = Q + dt R - e Q,
 * which is solved for Q' as the quadratic it is. Steady flow does not depend on dt, and stiff flow does not swing.
 * Laterals enter without momentum; withdrawals take theirs along.
 */
export interface Steps {
  /** From the state at the start of the step to the whole Euler step. */
  predict(dt: number): void;
  /** From there to the second-order state. */
  correct(dt: number): void;
  /** Closes an Euler step that is not corrected. */
  accept(dt: number): void;
  /** Lateral withdrawals (m³) that were asked for and were not there */
  missing(): number;
}

export function createSteps(
  workspace: Workspace,
  cellState: CellState,
  laterals: Laterals,
  ledger: VolumeLedger,
): Steps {
  const { n, dx, area, flow, stage, bed, dryDepth, friction, celerity } = workspace;
  const { fluxArea, fluxLeft, fluxRight, oldArea, halfFlow, implicitShare } = workspace;
  const { place } = cellState;
  const { rate } = laterals;
  const { abs, sqrt } = Math;
  const hasLaterals = laterals.any;
  const limitOutflow = createLimitOutflow(workspace);

  // Volumes of the predictor (m³/s), until the step is closed.
  let inflow = 0;
  let outflow = 0;
  let lateral = 0;
  let predictedMissing = 0;
  let missing = 0;
  let stageLateral = 0;
  let stageMissing = 0;

  /** Area of cell i after what comes from the side in `dt`; counts what was moved. */
  function withLateral(i: number, a: number, dt: number): number {
    const wanted = (dt * rate[i]) / dx;
    const taken = wanted < -a ? -a : wanted;
    stageLateral += (taken * dx) / dt;
    stageMissing += ((taken - wanted) * dx) / dt;
    return a + taken;
  }

  function predict(dt: number): void {
    limitOutflow(dt);
    const ratio = dt / dx;
    const fourDt = 4 * dt;
    stageLateral = 0;
    stageMissing = 0;
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
        if (a < before) q *= a / before;
      }
      const half = 0.5 * dt * friction[i] * abs(q0);
      const e = half < MOST_EXPLICIT ? half : MOST_EXPLICIT;
      implicitShare[i] = half < MOST_EXPLICIT ? 0.5 : 1 - (0.5 * MOST_EXPLICIT) / half;
      halfFlow[i] = 0.5 * (q0 + q) - e * q0;
      if (a !== old) place(i, a);
      flow[i] =
        stage[i] - bed[i] > dryDepth ? (2 * q) / (1 + sqrt(1 + fourDt * friction[i] * abs(q))) : 0;
    }
    inflow = fluxArea[0];
    outflow = fluxArea[n];
    lateral = stageLateral;
    predictedMissing = stageMissing;
  }

  function correct(dt: number): void {
    limitOutflow(dt);
    const ratio = dt / dx;
    const fourDt = 4 * dt;
    stageLateral = 0;
    stageMissing = 0;
    let drained = 0;
    for (let i = 1; i <= n; i++) {
      const old = oldArea[i];
      let a = area[i] - ratio * (fluxArea[i] - fluxArea[i - 1]);
      let q = halfFlow[i] - 0.5 * ratio * (fluxLeft[i] - fluxRight[i - 1]);
      if (a < 0) a = 0;
      if (hasLaterals && rate[i] !== 0) {
        const before = a;
        a = withLateral(i, a, dt);
        if (a < before) q *= (0.5 * (old + a)) / (0.5 * (old + before));
      }
      a = 0.5 * (old + a);
      if (a !== area[i]) place(i, a);
      const m = fourDt * implicitShare[i] * friction[i];
      flow[i] = stage[i] - bed[i] > dryDepth ? (2 * q) / (1 + sqrt(1 + m * abs(q))) : 0;
      if (a < 0.5 * old) drained++;
    }
    if (drained > 0) capDrained();
    ledger.enter(
      0.5 * dt * (inflow + fluxArea[0]),
      0.5 * dt * (lateral + stageLateral),
      0.5 * dt * (outflow + fluxArea[n]),
    );
    missing += 0.5 * dt * (predictedMissing + stageMissing);
  }

  function accept(dt: number): void {
    let drained = 0;
    for (let i = 1; i <= n; i++) if (area[i] < 0.5 * oldArea[i]) drained++;
    if (drained > 0) capDrained();
    ledger.enter(dt * inflow, dt * lateral, dt * outflow);
    missing += dt * predictedMissing;
  }

  /** A cell that lost more than half of its water may move no faster than a front from its neighbours can. */
  function capDrained(): void {
    for (let i = 1; i <= n; i++) {
      const a = area[i];
      if (a >= 0.5 * oldArea[i] || a <= 0) continue;
      const most = Math.max(frontOf(i - 1), frontOf(i + 1));
      const u = flow[i] / a;
      if (u > most) flow[i] = most * a;
      else if (u < -most) flow[i] = -most * a;
    }
  }

  function frontOf(i: number): number {
    if (i < 1 || i > n || area[i] <= 0) return 2 * celerity[Math.min(n, Math.max(1, i))];
    return abs(flow[i]) / area[i] + 2 * celerity[i];
  }

  return { predict, correct, accept, missing: () => missing };
}
