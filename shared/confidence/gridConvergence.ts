/**
 * Observed order and grid convergence index from one quantity on three grids.
 *
 *   p = ln|e32/e21| / ln r, for unequal ratios by fixed-point iteration of
 *   p = | ln|e32/e21| + ln((r21^p - s)/(r32^p - s)) | / ln r21,  s = sign(e32/e21)
 *   f_extrapolated = (r21^p f1 - f2)/(r21^p - 1)
 *   GCI = Fs |(f1 - f2)/f1| / (r21^p - 1),  Fs = 1.25 for three grids
 *
 * f1 is the finest grid; r = coarse cell size / fine cell size > 1.
 * Sources: P. J. Roache (1994), J. Fluids Eng. 116, 405-413; I. B. Celik et al. (2008), J. Fluids Eng. 130, 078001.
 */
export interface GridConvergence {
  /** Observed order; null where it cannot be told (no difference, or no convergence of the iteration). */
  order: number | null;
  /** Value that the grids tend to; null where the order is. */
  extrapolated: number | null;
  /** Fractions of the value, not percent. */
  gciFine: number | null;
  gciCoarse: number | null;
  kind: 'monotone' | 'oscillating' | 'unchanged' | 'diverging';
}

const SAFETY = 1.25;

/** Throws where a cell size does not shrink from coarse to fine. */
export function gridConvergence(
  values: readonly [fine: number, medium: number, coarse: number],
  cellSizes: readonly [fine: number, medium: number, coarse: number],
): GridConvergence {
  const [f1, f2, f3] = values;
  const r21 = cellSizes[1] / cellSizes[0];
  const r32 = cellSizes[2] / cellSizes[1];
  if (!(r21 > 1 && r32 > 1)) throw new RangeError('Cell sizes must grow from fine to coarse.');
  const e21 = f2 - f1;
  const e32 = f3 - f2;
  const none = { order: null, extrapolated: null, gciFine: null, gciCoarse: null };
  if (e21 === 0 || e32 === 0) return { ...none, kind: 'unchanged' };

  const oscillating = e32 / e21 < 0;
  const order = observedOrder(e32 / e21, r21, r32);
  if (order === null || order <= 0) return { ...none, kind: 'diverging' };
  const fine = r21 ** order - 1;
  const coarse = r32 ** order - 1;
  return {
    order,
    extrapolated: f1 - e21 / fine,
    gciFine: (SAFETY * Math.abs(e21 / f1)) / fine,
    gciCoarse: (SAFETY * Math.abs(e32 / f2)) / coarse,
    kind: oscillating ? 'oscillating' : 'monotone',
  };
}

function observedOrder(ratio: number, r21: number, r32: number): number | null {
  const log = Math.log(Math.abs(ratio));
  if (r21 === r32) return log / Math.log(r21);
  const sign = Math.sign(ratio);
  let p = Math.abs(log) / Math.log(r21);
  for (let k = 0; k < 200; k++) {
    const next = Math.abs(log + Math.log((r21 ** p - sign) / (r32 ** p - sign))) / Math.log(r21);
    if (!Number.isFinite(next)) return null;
    if (Math.abs(next - p) < 1e-12) return next;
    p = next;
  }
  return null;
}
