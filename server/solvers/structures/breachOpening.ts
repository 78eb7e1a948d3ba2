import type { BreachInput } from '../../../shared/case/structures';
import { crestHead, pieceHead, type Crest } from './crestFlow';

/** The trapezoid that has opened (m); while `roof` is below the top of the dam it is a pipe. */
export interface BreachOpening {
  width: number;
  bottom: number;
  roof: number;
}

/**
 * How far a breach has grown, 0..1, at `age` seconds after its trigger: linear, or (1 - cos πt)/2, slow at both ends.
 */
export function breachGrowth(input: BreachInput, age: number): number {
  if (!(age >= 0)) return 0;
  if (age >= input.formationTime) return 1;
  const t = age / input.formationTime;
  return input.growth === 'linear' ? t : 0.5 * (1 - Math.cos(Math.PI * t));
}

/**
 * ∫ (z - ground)^1.5 ds (m^2.5) over a crest into which a trapezoid is cut: bottom `width` at `bottom` about offset
 * `centre`, sides of `slope` horizontal to 1 vertical. Piece by piece, each exact.
 */
export function openedHead(
  crest: Crest,
  z: number,
  centre: number,
  width: number,
  bottom: number,
  slope: number,
): number {
  if (!(width > 0)) return crestHead(crest, z);
  let sum = 0;
  for (let k = 2; k < crest.length; k += 2) {
    const from = crest[k - 2];
    const to = crest[k];
    if (!(to > from)) continue;
    const a = crest[k - 1];
    const fall = (crest[k + 1] - a) / (to - from);
    let x = from;
    while (x < to) {
      // Up to the next edge of the bottom both lines are straight: they cross once at most.
      const leftEdge = centre - 0.5 * width;
      const rightEdge = centre + 0.5 * width;
      const end =
        x < leftEdge ? Math.min(to, leftEdge) : x < rightEdge ? Math.min(to, rightEdge) : to;
      const side = end <= leftEdge ? -1 : x >= rightEdge ? 1 : 0;
      const c0 = a + fall * (x - from);
      const c1 = a + fall * (end - from);
      const t0 = cutLevel(x, side);
      const t1 = cutLevel(end, side);
      const d0 = t0 - c0;
      const d1 = t1 - c1;
      if (d0 < 0 !== d1 < 0 && Number.isFinite(d0) && Number.isFinite(d1)) {
        const cross = x + ((end - x) * d0) / (d0 - d1);
        const level = a + fall * (cross - from);
        sum += pieceHead(z, cross - x, Math.min(c0, t0), level);
        sum += pieceHead(z, end - cross, level, Math.min(c1, t1));
      } else sum += pieceHead(z, end - x, Math.min(c0, t0), Math.min(c1, t1));
      x = end;
    }
  }
  return sum;

  function cutLevel(x: number, side: number): number {
    if (side === 0) return bottom;
    const beyond = Math.max(0, Math.abs(x - centre) - 0.5 * width);
    return slope > 0 ? bottom + beyond / slope : Infinity;
  }
}
