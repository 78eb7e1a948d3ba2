/**
 * What a search makes small: J = √(mean of (e/tolerance)²) over all observations that could be compared. A mark counts with
 * its residual, the record of a gauge counts once for each quantity, with its root mean square error. 1 means that the
 * observations lie off by just what they are allowed on average. null of nothing.
 */
export function misfit(errors: readonly { error: number; tolerance: number }[]): number | null {
  if (errors.length === 0) return null;
  const sum = errors.reduce((total, { error, tolerance }) => total + (error / tolerance) ** 2, 0);
  return Math.sqrt(sum / errors.length);
}
