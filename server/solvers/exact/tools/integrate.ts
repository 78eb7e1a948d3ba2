/** Integral of a smooth function over an interval by composite Gauss-Legendre quadrature:
 *  `panels` equal parts, sixteen points in each, exact for polynomials of degree 31 on a part. */
export function integrate(f: (x: number) => number, from: number, to: number, panels = 8): number {
  const half = (to - from) / panels / 2;
  let sum = 0;
  for (let panel = 0; panel < panels; panel++) {
    const middle = from + (2 * panel + 1) * half;
    for (let i = 0; i < NODES.length; i++) {
      sum += WEIGHTS[i] * (f(middle - half * NODES[i]) + f(middle + half * NODES[i]));
    }
  }
  return sum * half;
}

const POINTS = 16;
const NODES: number[] = [];
const WEIGHTS: number[] = [];

/** Positive zeros of the Legendre polynomial of degree POINTS by Newton's method from Tricomi's
 *  estimate, and their weights 2/((1 - x²) P'(x)²) (Abramowitz & Stegun, 1964, 25.4.29). */
for (let i = 1; i <= POINTS / 2; i++) {
  let x = Math.cos((Math.PI * (i - 0.25)) / (POINTS + 0.5));
  let slope = 0;
  for (let iteration = 0; iteration < 10; iteration++) {
    let previous = 1;
    let value = x;
    for (let n = 2; n <= POINTS; n++) {
      [previous, value] = [value, ((2 * n - 1) * x * value - (n - 1) * previous) / n];
    }
    slope = (POINTS * (x * value - previous)) / (x * x - 1);
    x -= value / slope;
  }
  NODES.push(x);
  WEIGHTS.push(2 / ((1 - x * x) * slope * slope));
}
