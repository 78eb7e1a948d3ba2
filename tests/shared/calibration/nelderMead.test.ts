import { nelderMead } from '../../../shared/calibration/search/nelderMead';

/** Counts, so that the budget can be seen to hold. */
function counted(f: (x: number[]) => number) {
  const points: number[][] = [];
  return {
    points,
    f: async (x: number[]) => {
      points.push(x);
      return f(x);
    },
  };
}
const box = (n: number, low: number, high: number, step: number) => ({
  low: new Array<number>(n).fill(low),
  high: new Array<number>(n).fill(high),
  step: new Array<number>(n).fill(step),
});

/** Rosenbrock (1960), Computer Journal 3(3), 175-184: minimum 0 at (1, 1) [memory]. */
const rosenbrock = ([x, y]: number[]) => 100 * (y - x * x) ** 2 + (1 - x) ** 2;
/** Powell (1962), Computer Journal 5(2), 147-151: minimum 0 at the origin; Nelder and Mead tried it from (3, −1, 0, 1) [memory]. */
const powell = ([a, b, c, d]: number[]) =>
  (a + 10 * b) ** 2 + 5 * (c - d) ** 2 + (b - 2 * c) ** 4 + 10 * (a - d) ** 4;

test("finds the end of Rosenbrock's valley from its usual start", async () => {
  const { f, points } = counted(rosenbrock);
  const end = await nelderMead(f, [-1.2, 1], { ...box(2, -2, 2, 0.5), near: 1e-6, budget: 2000 });
  expect(end.why).toBe('settled');
  expect(end.x[0]).toBeCloseTo(1, 4);
  expect(end.x[1]).toBeCloseTo(1, 4);
  expect(end.evaluations).toBe(points.length);
});

test("finds the minimum of Powell's quartic, where the curvature vanishes", async () => {
  const options = { ...box(4, -5, 5, 0.5), near: 1e-6, budget: 5000 };
  const end = await nelderMead(async (x) => powell(x), [3, -1, 0, 1], options);
  expect(end.value).toBeLessThan(1e-8);
});

test('stops on a bound where the minimum lies beyond it', async () => {
  const { f, points } = counted(rosenbrock);
  // On x = 0.8 the least is at y = 0.64, with (1 − 0.8)² = 0.04.
  const options = {
    low: [-2, -2],
    high: [0.8, 2],
    step: [0.5, 0.5],
    near: 1e-6,
    budget: 4000,
  };
  const end = await nelderMead(f, [-1.2, 1], options);
  expect(end.x[0]).toBeCloseTo(0.8, 6);
  expect(end.x[1]).toBeCloseTo(0.64, 4);
  expect(end.value).toBeCloseTo(0.04, 6);
  expect(points.every(([x]) => x <= 0.8)).toBe(true);
});

test('never goes beyond its budget and answers the best that it has seen', async () => {
  const { f, points } = counted(rosenbrock);
  const end = await nelderMead(f, [-1.2, 1], { ...box(2, -2, 2, 0.5), near: 1e-6, budget: 17 });
  expect(end.why).toBe('budget');
  expect(points).toHaveLength(17);
  expect(end.value).toBe(Math.min(...points.map(rosenbrock)));
});

test('goes round points that cannot be evaluated', async () => {
  const f = async ([x, y]: number[]) => (x > 0.5 ? Infinity : (x - 0.3) ** 2 + (y + 0.2) ** 2);
  const end = await nelderMead(f, [0, 0], { ...box(2, -1, 1, 0.6), near: 1e-5, budget: 500 });
  expect(end.x[0]).toBeCloseTo(0.3, 3);
  expect(end.x[1]).toBeCloseTo(-0.2, 3);
});
