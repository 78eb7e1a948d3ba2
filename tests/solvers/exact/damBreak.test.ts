import { damBreak } from '@/server/solvers/exact/damBreak';
import { parabola, trapezoid } from '@/server/solvers/exact/prismaticSection';
import { waveSpeed } from '@/server/solvers/exact/waveSpeed';

/** Published closed forms of A. Ritter (1892), Z. VDI 36, 947-954 and J. J. Stoker (1957), Water Waves,
 *  sec. 10.8, and the values that follow from them, computed to 8 digits apart from this program in
 *  30-digit arithmetic. Tolerance: the last printed digit. */
const G = 9.81;
const rectangle = trapezoid(1, 0);
const DIGITS = 6e-8;

function near(actual: number, expected: number): void {
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(DIGITS * Math.max(1, Math.abs(expected)));
}

describe('dam break on a dry bed, rectangle', () => {
  it.each([
    [-1.0, 1.0, 0.0],
    [-0.75, 0.84027778, 0.16666667],
    [-0.5, 0.69444444, 0.33333333],
    [0.0, 0.44444444, 0.66666667],
    [0.5, 0.25, 1.0],
    [1.0, 0.11111111, 1.3333333],
    [1.9, 0.0011111111, 1.9333333],
  ])('at x = %f c0 t the depth is %f h0 and the velocity %f c0', (place, depth, velocity) => {
    for (const h0 of [10, 6, 1, 0.25]) {
      const c0 = Math.sqrt(G * h0);
      const state = damBreak(rectangle, G, h0, 0).at(place * c0);
      near(state.depth / h0, depth);
      near(state.velocity / c0, velocity);
    }
  });

  it('has its front at 2 c0 and nothing beyond', () => {
    const solution = damBreak(rectangle, G, 10, 0);
    expect(solution.star).toBeNull();
    expect(solution.rightWave).toBeNull();
    near(solution.leftWave![0], -9.9045444);
    near(solution.leftWave![1], 19.809089);
    expect(solution.at(19.81)).toEqual({ depth: 0, velocity: 0 });
  });
});

describe('dam break on a wet bed, rectangle', () => {
  it.each([
    [10, 5, 7.2692045, 2.919933, 9.3537584, -9.9045444, -5.5246449],
    [10, 1, 3.9617482, 7.340769, 9.8192948, -9.9045444, 1.1066092],
    [1, 0.1, 0.39617482, 2.321355, 3.1051337, -3.132092, 0.34994054],
    [1, 0.01, 0.17117892, 3.6724546, 3.9003042, -3.132092, 2.37659],
    [0.25, 0.025, 0.099043704, 1.1606775, 1.5525668, -1.566046, 0.17497027],
  ])('%f m over %f m', (above, below, h2, u2, shock, head, tail) => {
    const { star, leftWave, rightWave } = damBreak(rectangle, G, above, below);
    near(star!.depth, h2);
    near(star!.velocity, u2);
    near(rightWave![0], shock);
    near(leftWave![0], head);
    near(leftWave![1], tail);
  });

  it.each([
    [10, 5, -9, 9.4004259, 0.60302961],
    [10, 5, -5.6, 7.3125132, 2.8696963],
    [10, 5, 9.3, 7.2692045, 2.919933],
    [10, 5, 9.4, 5, 0],
    [10, 1, -5, 6.9712412, 3.2696963],
    [10, 1, 0, 4.4444444, 6.6030296],
    [10, 1, 1, 4.007043, 7.2696963],
    [10, 1, 9.8, 3.9617482, 7.340769],
    [1, 0.1, -2, 0.77355007, 0.75472797],
    [1, 0.1, 0.3, 0.40289376, 2.2880613],
    [1, 0.1, 3.2, 0.1, 0],
  ])('%f m over %f m at x/t = %f', (above, below, speed, depth, velocity) => {
    const state = damBreak(rectangle, G, above, below).at(speed);
    near(state.depth, depth);
    near(state.velocity, velocity);
  });

  it('keeps the dry-bed flow at the dam until the tailwater passes 0.138 of the depth above', () => {
    // Limit published by Stoker: 0.138; more exactly 0.138270.
    near(damBreak(rectangle, G, 1, 0.1382).at(0).depth, 4 / 9);
    expect(damBreak(rectangle, G, 1, 0.1384).at(0).depth).toBeGreaterThan(4 / 9 + 1e-5);
  });
});

describe('dam break in other sections', () => {
  // ω = 2 m c for A = k h^m; e.g. C. H. Su & A. H. Barnes (1970), J. Hydraul. Div. ASCE 96(HY3) [from memory].
  it.each([
    ['rectangle', trapezoid(7, 0), 2, 2 / 3, 4 / 9],
    ['parabola', parabola(5), 3, 0.75, 0.5625],
    ['triangle', trapezoid(0, 2), 4, 0.8, 0.64],
  ])('%s: front, velocity and depth at the dam', (_name, section, front, velocity, depth) => {
    const c0 = waveSpeed(section, G, 4);
    const solution = damBreak(section, G, 4, 0);
    near(solution.leftWave![1] / c0, front);
    near(solution.at(0).velocity / c0, velocity);
    near(solution.at(0).depth / 4, depth);
  });

  it.each([
    [0, 4.9522722, 19.809089, 3.2, 3.9618178, 81.138028],
    [20, 6.06527, 14.871321, 2.532744, 4.5463371, 288.62177],
  ])('bottom %d m, sides 2:1, dry', (bottom, c0, front, depth, velocity, flow) => {
    const section = trapezoid(bottom, 2);
    const solution = damBreak(section, G, 5, 0);
    const dam = solution.at(0);
    near(-solution.leftWave![0], c0);
    near(solution.leftWave![1], front);
    near(dam.depth, depth);
    near(dam.velocity, velocity);
    near(section.area(dam.depth) * dam.velocity, flow);
  });

  it.each([
    [0, 2.4269938, 6.0079848, 70.777652, 7.2365364, 2.5577088],
    [20, 2.5777507, 4.4495928, 288.53211, 6.7343853, -0.13152323],
  ])('bottom %d m, sides 2:1, 5 m over 1 m', (bottom, h2, u2, flow, shock, tail) => {
    const section = trapezoid(bottom, 2);
    const { star, leftWave, rightWave } = damBreak(section, G, 5, 1);
    near(star!.depth, h2);
    near(star!.velocity, u2);
    near(section.area(star!.depth) * star!.velocity, flow);
    near(rightWave![0], shock);
    near(leftWave![1], tail);
  });
});
