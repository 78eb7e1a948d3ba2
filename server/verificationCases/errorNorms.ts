import type { ErrorNorms } from '../../shared/verificationCases/types';

/** Norms of the differences at equal cells (or equal steps of time), where `counts` says so. */
export function errorNorms(
  computed: readonly number[],
  exact: readonly number[],
  counts: (index: number) => boolean,
): ErrorNorms {
  let sum = 0;
  let squares = 0;
  let max = 0;
  let count = 0;
  for (let i = 0; i < computed.length; i++) {
    if (!counts(i)) continue;
    const error = Math.abs(computed[i] - exact[i]);
    sum += error;
    squares += error * error;
    max = Math.max(max, error);
    count++;
  }
  return { l1: sum / count, l2: Math.sqrt(squares / count), max };
}

/** Below this share of the largest value an error is rounding, and has no order. */
const ROUNDING = 1e-11;

/** log(coarse error / fine error) / log(fine cells / coarse cells); null where rounding is all that is left. */
export function observedOrder(
  coarse: { cells: number; error: number },
  fine: { cells: number; error: number },
  scale: number,
): number | null {
  if (!(coarse.error > ROUNDING * scale) || !(fine.error > ROUNDING * scale)) return null;
  return Math.log(coarse.error / fine.error) / Math.log(fine.cells / coarse.cells);
}
