import { bracket } from './interpolate';

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
  const { places, moments, times, stage } = surface;
  if (moments === 0) return out.fill(NaN);
  const first = moments > 1 ? bracket(times, t) : 0;
  const next = Math.min(first + 1, moments - 1);
  const width = times[next] - times[first];
  const share = width > 0 ? Math.min(1, Math.max(0, (t - times[first]) / width)) : 0;
  for (let i = 0; i < places; i++) {
    const before = stage[first * places + i];
    out[i] = before + (stage[next * places + i] - before) * share;
  }
  return out;
}
