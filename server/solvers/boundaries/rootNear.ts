/**
 * The root of an increasing function at or above `floor`, searched from `guess` in steps that begin with `step`; the
 * floor itself where the function is not negative there. Illinois form of false position (Dowell and Jarratt 1971, BIT
 * 11, 168-174).
 */
export function rootNear(
  f: (x: number) => number,
  floor: number,
  guess: number,
  step: number,
): number {
  if (!(guess > floor)) return risingRoot(f, floor, step);
  if (f(guess) < 0) return risingRoot(f, guess, step);
  let hi = guess;
  for (;;) {
    const lo = Math.max(floor, hi - step);
    if (lo === floor || f(lo) < 0) return risingRoot(f, lo, hi - lo);
    hi = lo;
    step *= 4;
  }
}

/** The root of an increasing function at or above `lo`, or where it is within `enough` of 0; see rootNear. */
export function risingRoot(f: (x: number) => number, lo: number, step: number, enough = 0): number {
  let fLo = f(lo);
  if (fLo >= 0) return lo;
  let hi = lo + step;
  let fHi = f(hi);
  for (let k = 0; fHi < 0 && k < 60; k++) {
    lo = hi;
    fLo = fHi;
    step *= 4;
    hi = lo + step;
    fHi = f(hi);
  }
  if (fHi <= enough) return hi;
  let best = -fLo < fHi ? lo : hi;
  let least = Math.min(-fLo, fHi);
  let side = 0;
  for (let k = 0; k < 100 && hi - lo > 4e-16 * Math.max(Math.abs(lo), Math.abs(hi)); k++) {
    const x = hi - (fHi * (hi - lo)) / (fHi - fLo);
    if (!(x > lo && x < hi)) break;
    const fx = f(x);
    if (Math.abs(fx) < least) {
      least = Math.abs(fx);
      best = x;
    }
    if (Math.abs(fx) <= enough) break;
    if (fx < 0) {
      lo = x;
      fLo = fx;
      if (side === -1) fHi *= 0.5;
      side = -1;
    } else {
      hi = x;
      fHi = fx;
      if (side === 1) fLo *= 0.5;
      side = 1;
    }
  }
  return best;
}
