import type { ResidualSummary } from './types';

/**
 * Residual e = computed − observed. Mean error Σe/n, root mean square error √(Σe²/n), both in the unit of e.
 * `tolerances` holds for each e what counts as near enough; arrays of one length. null of nothing.
 */
export function summarise(
  residuals: readonly number[],
  tolerances: readonly number[],
): ResidualSummary | null {
  const count = residuals.length;
  if (count === 0) return null;
  let sum = 0;
  let squares = 0;
  let largest = 0;
  let within = 0;
  residuals.forEach((e, i) => {
    sum += e;
    squares += e * e;
    largest = Math.max(largest, Math.abs(e));
    if (Math.abs(e) <= tolerances[i] + ROUNDING) within++;
  });
  return { count, mean: sum / count, rms: Math.sqrt(squares / count), largest, within };
}

/** 12.3 − 12.0 is a little more than 0.3 in binary, m. */
const ROUNDING = 1e-9;

/**
 * Efficiency of Nash & Sutcliffe (1970), J. Hydrology 10(3), 282-290: 1 − Σ(o − c)² / Σ(o − ō)². 1 is perfect, 0 is no
 * better than the mean of the record; null where the record does not vary.
 */
export function efficiency(
  observed: readonly number[],
  computed: readonly number[],
): number | null {
  const n = observed.length;
  if (n === 0) return null;
  const mean = observed.reduce((sum, o) => sum + o, 0) / n;
  let left = 0;
  let spread = 0;
  for (let i = 0; i < n; i++) {
    left += (observed[i] - computed[i]) ** 2;
    spread += (observed[i] - mean) ** 2;
  }
  return spread > 0 ? 1 - left / spread : null;
}
