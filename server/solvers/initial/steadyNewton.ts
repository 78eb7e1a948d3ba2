import type { CellState } from '../geometry/cellState';
import type { Workspace } from '../workspace';
import { solveBanded } from './solveBanded';
import type { SteadyResidual } from './steadyResidual';
import { stillFlow } from './stillFlow';

/** Steady: no cell gains or loses more than this share of the largest flow. */
const STEADY = 1e-9;
const MOST_ITERATIONS = 60;
/** Iterations without getting nearer after which it is given up */
const PATIENCE = 12;
const NEARER = 0.9;
/** Pseudo time step at first and at most, in Courant numbers of each cell */
const FIRST_COURANT = 20;
const LARGEST_COURANT = 1e12;
/** What an iteration may do: raise the residual so many times, take this share of a cell's water, add as much as it has. */
const MOST_RISE = 2;
const MOST_TAKEN = 0.5;
const MOST_ADDED = 1;

/** Takes the water to the steady state. True if it came there; else the nearest state is left. */
export type SteadyNewton = (poll: () => void) => boolean;

/**
 * The steady state as the root of what the scheme itself says of dA/dt and dQ/dt, by pseudo-transient continuation
 * (Kelley and Keyes 1998, SIAM J. Numer. Anal. 35, 508-523): (1/τ - J) δ = R. τ is a Courant number of each cell that grows
 * as the residual falls, so that the last iterations are Newton's. R is measured in parts of the largest flow: dx dA/dt/Q, dx dQ/dt/(Q (|u| + c)).
 */
export function createSteadyNewton(
  workspace: Workspace,
  cellState: CellState,
  { half, wet, look, evaluate, differentiate }: SteadyResidual,
): SteadyNewton {
  const { n, dx, area, flow, celerity, fluxArea } = workspace;
  const { follow } = cellState;
  const { abs, max, min } = Math;
  const size = 2 * n;
  const stride = 3 * half + 1;
  const jacobian = new Float64Array(size * stride);
  const band = new Float64Array(size * stride);
  const residual = new Float64Array(size);
  const tried = new Float64Array(size);
  const change = new Float64Array(size);
  const before = new Float64Array(size);
  const best = new Float64Array(size);
  const weight = new Float64Array(size);
  const speed = new Float64Array(n + 2);
  let scale = 0;

  function keep(into: Float64Array): void {
    for (let i = 1; i <= n; i++) {
      into[2 * i - 2] = area[i];
      into[2 * i - 1] = flow[i];
    }
  }

  function putBack(from: Float64Array): void {
    for (let i = 1; i <= n; i++) {
      area[i] = from[2 * i - 2];
      flow[i] = from[2 * i - 1];
      follow(i);
    }
  }

  /** The residual of the present state and its largest part */
  function measure(): number {
    look();
    for (let i = 1; i <= n; i++) {
      if (wet[i] === 0) flow[i] = 0;
      speed[i] = wet[i] === 1 ? abs(flow[i]) / area[i] + celerity[i] : 1;
      weight[2 * i - 2] = dx / scale;
      weight[2 * i - 1] = dx / (scale * speed[i]);
    }
    evaluate(residual);
    return largest(residual);
  }

  function largest(of: Float64Array): number {
    let most = 0;
    for (let k = 0; k < size; k++) {
      const share = weight[k] * abs(of[k]);
      if (!(share <= most)) most = share;
    }
    return most;
  }

  /** One iteration's change of all areas and flows, into `change`; false where there is none. */
  function findChange(courant: number): boolean {
    for (let row = 0; row < size; row++) {
      const at = row * stride;
      const i = (row >> 1) + 1;
      if (wet[i] === 0) {
        band.fill(0, at, at + stride);
        band[at + half] = 1;
        change[row] = 0;
        continue;
      }
      const w = weight[row];
      for (let k = at; k < at + stride; k++) band[k] = -w * jacobian[k];
      band[at + half] += (w * speed[i]) / (courant * dx);
      change[row] = w * residual[row];
    }
    return solveBanded(band, half, change);
  }

  /** Makes the change, or the share of it that is returned. */
  function makeChange(): number {
    let share = 1;
    for (let i = 1; i <= n; i++) {
      const gain = change[2 * i - 2];
      const most = (gain < 0 ? MOST_TAKEN : MOST_ADDED) * area[i];
      if (abs(gain) * share > most) share = most / abs(gain);
    }
    for (let i = 1; i <= n; i++) {
      if (wet[i] === 0) continue;
      area[i] += share * change[2 * i - 2];
      flow[i] += share * change[2 * i - 1];
      follow(i);
    }
    return share;
  }

  return function steadyNewton(poll) {
    look();
    evaluate(residual);
    scale = stillFlow(workspace);
    for (let f = 0; f <= n; f++) scale = max(scale, abs(fluxArea[f]));
    if (!(scale > 0)) return true;
    let norm = measure();
    let least = norm;
    let nearer = 0;
    let courant = FIRST_COURANT;
    let isKnown = false;
    keep(best);
    for (let k = 0; k < MOST_ITERATIONS && norm > STEADY && k - nearer < PATIENCE; k++) {
      poll();
      if (!isKnown) differentiate(residual, jacobian);
      isKnown = true;
      keep(before);
      if (!findChange(courant)) break;
      const share = makeChange();
      evaluate(tried);
      if (!(largest(tried) < MOST_RISE * norm)) {
        putBack(before);
        courant *= 0.1;
        continue;
      }
      isKnown = false;
      const last = norm;
      norm = measure();
      const growth = share < 1 ? 0.5 : max(0.5, min(10, (2 * last) / norm));
      courant = min(LARGEST_COURANT, courant * growth);
      if (norm < NEARER * least) nearer = k;
      if (norm < least) {
        least = norm;
        keep(best);
      }
    }
    putBack(best);
    return least <= STEADY;
  };
}
