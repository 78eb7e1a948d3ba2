/** One ordinary differential equation dy/dx = f(x, y) from x = `from` to `to` (either way), by the
 *  embedded pair of order 5(4) of J. R. Dormand & P. J. Prince (1980), J. Comput. Appl. Math. 6, 19-26,
 *  with steps chosen so that the estimated error of a step stays under `tolerance` (in units of y).
 *
 *  Throws a RangeError where the equation becomes singular (the step falls below 1e-12 of the range). */
export function solveOde(
  f: (x: number, y: number) => number,
  from: number,
  to: number,
  start: number,
  tolerance = 1e-11,
): number {
  const range = to - from;
  const slopes = new Float64Array(7);
  let x = from;
  let y = start;
  let step = range / 64;
  while (x !== to) {
    if (Math.abs(step) >= Math.abs(to - x)) step = to - x;
    for (let stage = 0; stage < 7; stage++) {
      let slope = 0;
      for (let j = 0; j < stage; j++) slope += A[stage][j] * slopes[j];
      slopes[stage] = f(x + C[stage] * step, y + step * slope);
    }
    let change = 0;
    let error = 0;
    for (let stage = 0; stage < 7; stage++) {
      change += B[stage] * slopes[stage];
      error += E[stage] * slopes[stage];
    }
    const ratio = Math.abs(error * step) / tolerance;
    if (ratio <= 1) {
      x = step === to - x ? to : x + step;
      y += change * step;
    }
    // NaN (a state outside the equation's domain) counts as a step that was too long.
    step *= ratio >= 0 ? Math.min(4, Math.max(0.2, 0.9 * ratio ** -0.2)) : 0.2;
    if (x !== to && Math.abs(step) < 1e-12 * Math.abs(range)) {
      throw new RangeError(`the equation is singular near x = ${x}, y = ${y}`);
    }
  }
  return y;
}

const C = [0, 1 / 5, 3 / 10, 4 / 5, 8 / 9, 1, 1];
const B = [35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84, 0];
const A = [
  [],
  [1 / 5],
  [3 / 40, 9 / 40],
  [44 / 45, -56 / 15, 32 / 9],
  [19372 / 6561, -25360 / 2187, 64448 / 6561, -212 / 729],
  [9017 / 3168, -355 / 33, 46732 / 5247, 49 / 176, -5103 / 18656],
  [35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84],
];
/** Difference of the fifth- and fourth-order weights. */
const E = [71 / 57600, 0, -71 / 16695, 71 / 1920, -17253 / 339200, 22 / 525, -1 / 40];
