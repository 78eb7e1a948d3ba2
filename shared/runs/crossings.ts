/**
 * When values against time first exceed a level: linear between the moments, 0-based time of the series; the first
 * moment where they begin above it, null where they never do. As precise as the moments are close.
 */
export function firstAbove(
  times: ArrayLike<number>,
  values: ArrayLike<number>,
  level: number,
): number | null {
  for (let k = 0; k < times.length; k++) {
    if (!(values[k] > level)) continue;
    if (k === 0) return times[0];
    const share = (level - values[k - 1]) / (values[k] - values[k - 1]);
    return times[k - 1] + share * (times[k] - times[k - 1]);
  }
  return null;
}

/** How long (s) they stay above it in all, linear between the moments. */
export function timeAbove(
  times: ArrayLike<number>,
  values: ArrayLike<number>,
  level: number,
): number {
  let sum = 0;
  for (let k = 1; k < times.length; k++) {
    const [a, b] = [values[k - 1] - level, values[k] - level];
    const dt = times[k] - times[k - 1];
    if (a > 0 && b > 0) sum += dt;
    else if (a > 0 || b > 0) sum += (dt * Math.max(a, b)) / Math.abs(b - a);
  }
  return sum;
}
