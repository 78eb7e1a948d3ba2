/**
 * Sample quantile, linear between order statistics: at (n - 1) p of the sorted values, counted from 0.
 * Source: R. J. Hyndman and Y. Fan (1996), "Sample quantiles in statistical packages", Am. Stat. 50(4), 361-365, definition 7.
 * `sorted` rises; entries may be Infinity ("never"). NaN where it is empty; throws RangeError outside 0 <= p <= 1.
 */
export function quantile(sorted: ArrayLike<number>, p: number): number {
  if (!(p >= 0 && p <= 1)) throw new RangeError('A quantile lies between 0 and 1.');
  const n = sorted.length;
  if (n === 0) return NaN;
  const at = (n - 1) * p;
  const lower = Math.floor(at);
  const share = at - lower;
  const value = sorted[lower];
  return share === 0 || value === sorted[lower + 1]
    ? value
    : value + share * (sorted[lower + 1] - value);
}

/** The values of a band: 5, 50 and 95 of 100. `values` need not be sorted and are left as they are. */
export interface Band {
  p5: number;
  p50: number;
  p95: number;
}
export function bandOf(values: ArrayLike<number>): Band {
  const sorted = Float64Array.from(values).sort();
  return { p5: quantile(sorted, 0.05), p50: quantile(sorted, 0.5), p95: quantile(sorted, 0.95) };
}
