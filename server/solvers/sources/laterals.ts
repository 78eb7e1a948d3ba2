import type { Lateral } from '../../../shared/case/caseFile';
import type { Grid } from '../geometry/grid';
import { createSeries } from './series';

/** Lateral inflows and withdrawals, spread over the cells of their stretch. */
export interface Laterals {
  readonly any: boolean;
  /** Flow into cell i (1..n), m³/s, at the time last set; negative takes out */
  readonly rate: Float64Array;
  /** Largest inflow that a cell can ever get (m³/s) */
  readonly largest: Float64Array;
  setTime(time: number): void;
  /** Sum over all laterals at a time of those that lie wholly upstream of chainage x, in part where it cuts them. */
  totalAbove(x: number, time: number): number;
}

export function createLaterals(
  laterals: readonly Lateral[],
  grid: Grid,
  rate: Float64Array = new Float64Array(grid.cells + 2),
): Laterals {
  const { cells, dx, start } = grid;
  const largest = new Float64Array(cells + 2);
  const parts = laterals.map((lateral) => {
    const first = cellOf(lateral.from);
    const last = Math.max(first, cellOf(lateral.to));
    const length = lateral.to - lateral.from;
    const weights = new Float64Array(last - first + 1).fill(1);
    if (length > 0) {
      for (let i = first; i <= last; i++) {
        const lo = Math.max(lateral.from, start + (i - 1) * dx);
        const hi = Math.min(lateral.to, start + i * dx);
        weights[i - first] = Math.max(0, hi - lo) / length;
      }
    }
    return { lateral, first, weights, flow: createSeries(lateral.times, lateral.flows) };
  });
  for (const { lateral, first, weights } of parts) {
    const most = Math.max(0, ...lateral.flows);
    weights.forEach((weight, k) => (largest[first + k] += weight * most));
  }

  function cellOf(x: number): number {
    return Math.min(cells, Math.max(1, Math.floor((x - start) / dx) + 1));
  }

  function setTime(time: number): void {
    rate.fill(0);
    for (const { first, weights, flow } of parts) {
      const total = flow(time);
      for (let k = 0; k < weights.length; k++) rate[first + k] += weights[k] * total;
    }
  }

  function totalAbove(x: number, time: number): number {
    let sum = 0;
    for (const { lateral, flow } of parts) {
      const length = lateral.to - lateral.from;
      const share = length > 0 ? (x - lateral.from) / length : x >= lateral.from ? 1 : 0;
      sum += Math.min(1, Math.max(0, share)) * flow(time);
    }
    return sum;
  }

  return { any: laterals.length > 0, rate, largest, setTime, totalAbove };
}
