import { bracket, valueAt } from './interpolate';

/** The part of a decoded surface block that a frame is made of. */
interface Moments {
  places: number;
  moments: number;
  times: ArrayLike<number>;
  stage: Float32Array;
}

/**
 * The water surface at time `t` (s), m, linear between the stored moments and held outside them. Writes into `out` of
 * length `places` and gives it back, so that play makes no garbage.
 */
export function surfaceFrame(surface: Moments, t: number, out: Float32Array): Float32Array {
  const { places, stage } = surface;
  if (surface.moments === 0) return out.fill(NaN);
  const { first, next, share } = between(surface, t);
  for (let i = 0; i < places; i++) {
    const before = stage[first * places + i];
    out[i] = before + (stage[next * places + i] - before) * share;
  }
  return out;
}

/** The water level at one chainage at time `t`, m, linear in both. */
export function surfaceLevel(
  surface: Moments & { chainages: ArrayLike<number> },
  t: number,
  chainage: number,
): number {
  const { places, chainages, stage } = surface;
  if (surface.moments === 0) return NaN;
  const { first, next, share } = between(surface, t);
  const at = (moment: number) =>
    valueAt(chainages, stage.subarray(moment * places, (moment + 1) * places), chainage);
  return at(first) + (at(next) - at(first)) * share;
}

/** The stored moments about a time, and how far it has gone from the first to the next. */
function between({ moments, times }: Moments, t: number) {
  const first = moments > 1 ? bracket(times, t) : 0;
  const next = Math.min(first + 1, moments - 1);
  const width = times[next] - times[first];
  const share = width > 0 ? Math.min(1, Math.max(0, (t - times[first]) / width)) : 0;
  return { first, next, share };
}
