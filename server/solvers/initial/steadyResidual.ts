import type { CellState } from '../geometry/cellState';
import type { Rhs } from '../rhs';
import type { Laterals } from '../sources/laterals';
import type { Workspace } from '../workspace';

/** Share of area and flow by which derivatives are taken. */
const NUDGE = 1e-7;

/** What the scheme says of dA/dt (m²/s) and dQ/dt (m³/s²) at time 0; the two of cell i stand at 2 i - 2 and 2 i - 1. */
export interface SteadyResidual {
  /** Diagonals on either side of the main one that derivatives reach */
  readonly half: number;
  /** 1 where a cell is above the dry depth: the others stay as they are, and keep their water if no more comes. */
  readonly wet: Uint8Array;
  /** Finds the wet cells of the present state. */
  look(): void;
  evaluate(into: Float64Array): void;
  /** Derivatives at the state whose residual is given, as solveBanded wants them */
  differentiate(residual: Float64Array, into: Float64Array): void;
}

/**
 * Derivatives are differences, many columns at once (Curtis, Powell and Reid 1974, J. Inst. Maths Applics 13, 117-119): a
 * cell feels the cells up to `reach` away, so that every (2 reach + 1)th can be changed together.
 */
export function createSteadyResidual(
  workspace: Workspace,
  cellState: CellState,
  rhs: Rhs,
  laterals: Laterals,
  order: 1 | 2,
  hasStructures: boolean,
): SteadyResidual {
  const { n, dx, area, flow, stage, bed, celerity, friction, dryDepth } = workspace;
  const { fluxArea, fluxLeft, fluxRight } = workspace;
  const { rate } = laterals;
  const { follow } = cellState;
  const { abs, max, min } = Math;
  // The slope beside a structure is made of the two cells behind it: the structure is felt three cells away.
  const reach = order === 1 ? 1 : hasStructures ? 3 : 2;
  const half = 2 * reach + 1;
  const stride = 3 * half + 1;
  const nudged = new Float64Array(2 * n);
  const kept = new Float64Array(n + 2);
  const wet = new Uint8Array(n + 2);

  function look(): void {
    for (let i = 1; i <= n; i++) wet[i] = stage[i] - bed[i] > dryDepth ? 1 : 0;
  }

  function evaluate(into: Float64Array): void {
    rhs(0);
    for (let i = 1; i <= n; i++) {
      const gain = (fluxArea[i - 1] - fluxArea[i] + rate[i]) / dx;
      if (wet[i] === 0) {
        // A withdrawal takes no more than what comes.
        into[2 * i - 2] = max(0, gain);
        into[2 * i - 1] = 0;
        continue;
      }
      const q = flow[i];
      const taken = rate[i] < 0 ? (rate[i] * q) / (dx * area[i]) : 0;
      into[2 * i - 2] = gain;
      into[2 * i - 1] = (fluxRight[i - 1] - fluxLeft[i]) / dx - friction[i] * abs(q) * q + taken;
    }
  }

  function differentiate(residual: Float64Array, into: Float64Array): void {
    into.fill(0);
    for (let first = 1; first <= 2 * reach + 1; first++) {
      differentiateBy(area, first, 0, residual, into);
      differentiateBy(flow, first, 1, residual, into);
    }
  }

  /** Columns of the areas or of the flows (`kind` 0 or 1) of one group of cells */
  function differentiateBy(
    values: Float64Array,
    first: number,
    kind: 0 | 1,
    residual: Float64Array,
    into: Float64Array,
  ): void {
    for (let j = first; j <= n; j += 2 * reach + 1) {
      kept[j] = values[j];
      if (wet[j] === 0) continue;
      values[j] += NUDGE * (kind === 0 ? area[j] : max(abs(flow[j]), area[j] * celerity[j]));
      if (kind === 0) follow(j);
    }
    evaluate(nudged);
    for (let j = first; j <= n; j += 2 * reach + 1) {
      if (wet[j] === 0) continue;
      const nudge = values[j] - kept[j];
      values[j] = kept[j];
      if (kind === 0) follow(j);
      const column = 2 * j - 2 + kind;
      const last = 2 * min(n, j + reach) - 1;
      for (let row = 2 * max(1, j - reach) - 2; row <= last; row++) {
        into[row * stride + column - row + half] = (nudged[row] - residual[row]) / nudge;
      }
    }
  }

  return { half, wet, look, evaluate, differentiate };
}
