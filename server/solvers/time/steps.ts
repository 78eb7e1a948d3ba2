import type { VolumeLedger } from '../diagnostics/volumeLedger';
import type { Kernel } from '../kernel';
import type { Workspace } from '../workspace';

/**
 * Both halves of a step of the second-order strong-stability-preserving Runge-Kutta method (Heun; Shu and Osher 1988,
 * J. Comput. Phys. 77, 439-471). Each uses the fluxes in the workspace.
 *
 * Friction -k Q|Q|, k = g/(A V²), is implicit in the predictor, and trapezoidal in the step as a whole with less
 * explicit part the stiffer it is: with z = dt k|Q| at the start, e = min(z/2, 1/4), R the mean of both fluxes,
 *   Q' + (1 - e/z) dt k' Q'|Q'| = Q + dt R - e Q,
 * which is solved for Q' as the quadratic it is. Steady flow does not depend on dt, and stiff flow does not swing.
 * The loops are in stepLoops.ts. Laterals enter without momentum. A withdrawal takes the velocity of the
 * state of each half along, which keeps second order; one that takes more than half of the water, its share of the flow.
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

export function createSteps(workspace: Workspace, kernel: Kernel, ledger: VolumeLedger): Steps {
  const { n, area, flow, celerity, fluxArea, oldArea, lateralSums } = workspace;
  const { abs } = Math;

  // Volumes of the predictor (m³/s), until the step is closed.
  let inflow = 0;
  let outflow = 0;
  let lateral = 0;
  let predictedMissing = 0;
  let missing = 0;

  function predict(dt: number): void {
    kernel.limitOutflow(dt);
    kernel.predict(dt);
    inflow = fluxArea[0];
    outflow = fluxArea[n];
    lateral = lateralSums[0];
    predictedMissing = lateralSums[1];
  }

  function correct(dt: number): void {
    kernel.limitOutflow(dt);
    if (kernel.correct(dt) > 0) capDrained();
    ledger.enter(
      0.5 * dt * (inflow + fluxArea[0]),
      0.5 * dt * (lateral + lateralSums[0]),
      0.5 * dt * (outflow + fluxArea[n]),
    );
    missing += 0.5 * dt * (predictedMissing + lateralSums[1]);
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
