/** Root of a continuous function in a bracket, by Brent's method (R. P. Brent, 1973, "Algorithms for
 *  Minimization without Derivatives", ch. 4): inverse quadratic or secant steps, guarded by bisection.
 *
 *  f(low) and f(high) must differ in sign (or be zero), else a RangeError says so. The answer is good to
 *  a few units in the last place of the bracket. */
export function findRoot(f: (x: number) => number, low: number, high: number): number {
  let a = low;
  let b = high;
  let fa = f(a);
  let fb = f(b);
  if (!(fa * fb <= 0)) {
    throw new RangeError(`no change of sign between ${low} (${fa}) and ${high} (${fb})`);
  }
  let c = a;
  let fc = fa;
  let step = b - a;
  let previous = step;
  for (let i = 0; i < 200; i++) {
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const tolerance = 2 * Number.EPSILON * Math.abs(b);
    const half = (c - b) / 2;
    if (fb === 0 || Math.abs(half) <= tolerance) return b;
    const trial = Math.abs(fa) > Math.abs(fb) ? interpolate(a, b, c, fa, fb, fc) : half;
    const inside = trial * half > 0 && Math.abs(trial) < Math.abs(1.5 * half);
    if (Math.abs(previous) > tolerance && inside && Math.abs(trial) < Math.abs(previous / 2)) {
      previous = step;
      step = trial;
    } else {
      step = half;
      previous = half;
    }
    a = b;
    fa = fb;
    b += Math.abs(step) > tolerance ? step : Math.sign(half) * tolerance;
    fb = f(b);
    if (fb > 0 === fc > 0) {
      c = a;
      fc = fa;
      step = b - a;
      previous = step;
    }
  }
  return b;
}

/** The step from b that a secant (two points) or an inverse parabola (three points) suggests. */
function interpolate(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const s = fb / fa;
  if (a === c) return (s * (b - a)) / (1 - s);
  const q = fa / fc;
  const r = fb / fc;
  const p = s * ((c - b) * q * (q - r) - (b - a) * (r - 1));
  return -p / ((q - 1) * (r - 1) * (s - 1));
}
