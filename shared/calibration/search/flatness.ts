import type { Flatness, SearchStretch } from './types';

/** Multipliers that are tried beside the best, as factors of it; those beyond the bounds are left out. */
const STEPS = [0.8, 0.9, 1.1, 1.25];
/** As good as the best: a tenth above it, or a tenth of the tolerance where the best is very small. */
export const nearBest = (misfit: number): number => misfit + Math.max(0.1 * misfit, 0.1);
/** A bound is reached where the best lies this near to it. */
const AT_BOUND = 0.002;

type Bounds = Pick<SearchStretch, 'low' | 'high'>;

/** What to try along one multiplier to see how flat the optimum is. */
export function trialsAlong(best: number, { low, high }: Bounds): number[] {
  const trials = STEPS.map((step) => Math.min(high, Math.max(low, best * step)));
  return [...new Set(trials)].filter((factor) => Math.abs(factor / best - 1) > 0.01);
}

/** From the points tried along a multiplier, the best among them. */
export function flatnessOf(
  points: readonly { factor: number; misfit: number | null }[],
  best: { factor: number; misfit: number },
  { low, high }: Bounds,
): Flatness {
  const all = [...points, { factor: best.factor, misfit: best.misfit }].sort(
    (a, b) => a.factor - b.factor,
  );
  const known = all.flatMap(({ factor, misfit }) => (misfit === null ? [] : [{ factor, misfit }]));
  return {
    factors: all.map(({ factor }) => factor),
    misfit: all.map(({ misfit }) => misfit),
    curvature: curvatureAt(known, best.factor),
    range: rangeOf(known, best),
    atBound:
      best.factor / low - 1 < AT_BOUND ? 'low' : 1 - best.factor / high < AT_BOUND ? 'high' : null,
  };
}

type Point = { factor: number; misfit: number };

/** Second derivative of a parabola through J² against u = ln(m / best), by least squares. */
function curvatureAt(points: Point[], best: number): number | null {
  if (points.length < 3) return null;
  // Normal equations of a + b u + c u²: moments of u, and of u with J².
  const s = [0, 0, 0, 0, 0];
  const r = [0, 0, 0];
  for (const { factor, misfit } of points) {
    const u = Math.log(factor / best);
    const y = misfit * misfit;
    for (let k = 0; k <= 4; k++) s[k] += u ** k;
    for (let k = 0; k <= 2; k++) r[k] += y * u ** k;
  }
  const determinant = (m: number[][]) =>
    m[0][0] * (m[1][1] * m[2][2] - m[1][2] * m[2][1]) -
    m[0][1] * (m[1][0] * m[2][2] - m[1][2] * m[2][0]) +
    m[0][2] * (m[1][0] * m[2][1] - m[1][1] * m[2][0]);
  const whole = determinant([
    [s[0], s[1], s[2]],
    [s[1], s[2], s[3]],
    [s[2], s[3], s[4]],
  ]);
  const square = determinant([
    [s[0], s[1], r[0]],
    [s[1], s[2], r[1]],
    [s[2], s[3], r[2]],
  ]);
  return whole === 0 ? null : (2 * square) / whole;
}

/** Outwards from the best as far as the misfit, straight between the points, stays near it. */
function rangeOf(points: Point[], best: Point): Flatness['range'] {
  const limit = nearBest(best.misfit);
  const at = points.findIndex(({ factor }) => factor === best.factor);
  if (at < 0) return null;
  const walk = (step: 1 | -1) => {
    let here = points[at];
    for (let k = at + step; k >= 0 && k < points.length; k += step) {
      const next = points[k];
      if (next.misfit > limit) {
        const share = (limit - here.misfit) / (next.misfit - here.misfit);
        return { factor: here.factor + share * (next.factor - here.factor), open: false };
      }
      here = next;
    }
    return { factor: here.factor, open: true };
  };
  const [down, up] = [walk(-1), walk(1)];
  return { low: down.factor, high: up.factor, lowOpen: down.open, highOpen: up.open };
}
