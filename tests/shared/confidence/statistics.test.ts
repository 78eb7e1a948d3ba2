import { distributionFault, valueAt } from '@/shared/confidence/distributions';
import { inverseNormal } from '@/shared/confidence/inverseNormal';
import { latinHypercube } from '@/shared/confidence/latinHypercube';
import { PARAMETERS } from '@/shared/confidence/parameters';
import { bandOf, quantile } from '@/shared/confidence/quantile';

it.each([20, 101, 500])(
  'puts each of %d members into a stratum of its own, in every dimension',
  (n) => {
    // McKay, Beckman & Conover (1979): each stratum of probability 1/n is sampled exactly once.
    const points = latinHypercube(n, 4, 7);
    for (let d = 0; d < 4; d++) {
      const strata = points.map((point) => Math.floor(point[d] * n)).sort((a, b) => a - b);
      expect(strata).toEqual(Array.from({ length: n }, (_, k) => k));
    }
  },
);

it('pairs the strata at random, the same for the same seed', () => {
  const points = latinHypercube(200, 2, 1);
  expect(latinHypercube(200, 2, 1)).toEqual(points);
  expect(latinHypercube(200, 2, 2)).not.toEqual(points);
  // Uncorrelated: |r| of 200 independent pairs is below 3/sqrt(200) in all but a few of a thousand seeds.
  const mean = (values: number[]) => values.reduce((a, b) => a + b) / values.length;
  const [x, y] = [points.map((p) => p[0]), points.map((p) => p[1])];
  const [mx, my] = [mean(x), mean(y)];
  const r = mean(x.map((value, k) => (value - mx) * (y[k] - my))) * 12;
  expect(Math.abs(r)).toBeLessThan(0.21);
});

it('gives quantiles that were worked by hand', () => {
  // Definition 7 of Hyndman & Fan (1996): at (n - 1) p. Of 15, 20, 35, 40, 50: (5 - 1) 0.4 = 1.6 -> 20 + 0.6 × 15 = 29.
  expect(quantile([15, 20, 35, 40, 50], 0.4)).toBeCloseTo(29, 12);
  expect(quantile([15, 20, 35, 40, 50], 0)).toBe(15);
  expect(quantile([15, 20, 35, 40, 50], 1)).toBe(50);
  expect(quantile([3], 0.95)).toBe(3);
  expect(quantile([], 0.5)).toBeNaN();
  // Of 1..21: 0.05 × 20 = 1 -> the second; 0.95 × 20 = 19 -> the twentieth.
  expect(bandOf(Array.from({ length: 21 }, (_, k) => 21 - k))).toEqual({ p5: 2, p50: 11, p95: 20 });
  // A wave that never comes is later than any that does.
  expect(quantile([10, 20, Infinity], 0.5)).toBe(20);
  expect(quantile([10, Infinity, Infinity], 0.75)).toBe(Infinity);
  expect(() => quantile([1], 1.1)).toThrow(RangeError);
});

it('has the percentage points of the normal distribution that tables print', () => {
  // Abramowitz & Stegun (1964), table 26.5 and the usual tables: from memory, to the digits printed.
  const table: [number, number][] = [
    [0.5, 0],
    [0.75, 0.67448975],
    [0.9, 1.28155157],
    [0.95, 1.64485363],
    [0.975, 1.95996398],
    [0.999, 3.09023231],
    [0.9999, 3.71901649],
    [1e-6, -4.75342431],
    [1e-12, -7.03448383],
  ];
  for (const [p, z] of table) expect(inverseNormal(p)).toBeCloseTo(z, 7);
  for (const p of [0.01, 0.2, 0.4]) expect(inverseNormal(1 - p)).toBeCloseTo(-inverseNormal(p), 12);
});

it('draws from each distribution at its known quantiles', () => {
  const normal = { kind: 'normal', mean: 1, deviation: 0.1 } as const;
  expect(valueAt(normal, 0.975)).toBeCloseTo(1.195996398, 8);
  const lognormal = { kind: 'lognormal', median: 2, spread: 1.5 } as const;
  expect(valueAt(lognormal, 0.5)).toBeCloseTo(2, 12);
  expect(valueAt(lognormal, 0.841344746)).toBeCloseTo(3, 6);
  expect(valueAt({ kind: 'uniform', low: 2, high: 6 }, 0.25)).toBe(3);
  // Triangular 0, 1, 4: below the mode p = x²/4, above it 1 - p = (4 - x)²/12.
  const triangular = { kind: 'triangular', low: 0, mode: 1, high: 4 } as const;
  expect(valueAt(triangular, 0.25)).toBeCloseTo(1, 12);
  expect(valueAt(triangular, 0.0625)).toBeCloseTo(0.5, 12);
  expect(valueAt(triangular, 1 - 1 / 12)).toBeCloseTo(3, 12);
  expect(valueAt({ kind: 'triangular', low: 1, mode: 1, high: 2 }, 0)).toBeCloseTo(1, 12);
  // The tails are cut at 1 in 10,000.
  expect(valueAt(normal, 0)).toBeCloseTo(1 - 0.371901649, 8);
});

it('names what is wrong with a distribution', () => {
  expect(distributionFault({ kind: 'normal', mean: 1, deviation: 0.1 }, 'factor')).toBeNull();
  expect(distributionFault({ kind: 'normal', mean: 1, deviation: 0.3 }, 'factor')).toMatch(
    /0 or less/,
  );
  expect(distributionFault({ kind: 'normal', mean: 0, deviation: 0.3 }, 'metres')).toBeNull();
  expect(distributionFault({ kind: 'lognormal', median: 1, spread: 0.9 }, 'factor')).toMatch(
    /above 1/,
  );
  expect(distributionFault({ kind: 'triangular', low: 1, mode: 3, high: 2 }, 'factor')).toMatch(
    /between/,
  );
  expect(distributionFault({ kind: 'uniform', low: 1, high: 1 }, 'factor')).toMatch(/below/);
});

it('proposes for breaches what was published', () => {
  // T. L. Wahl (2001), table 1: Froehlich's width within 0.40-2.4 and time within 0.38-7.3 of the prediction, 95 %.
  const at = (key: 'breachWidth' | 'breachTime', p: number) =>
    valueAt(PARAMETERS[key].distribution, p);
  expect(at('breachWidth', 0.025)).toBeCloseTo(0.4, 2);
  expect(at('breachWidth', 0.975)).toBeCloseTo(2.4, 1);
  expect(at('breachTime', 0.025)).toBeCloseTo(0.38, 2);
  expect(at('breachTime', 0.975)).toBeCloseTo(7.3, 0);
  for (const parameter of Object.values(PARAMETERS))
    expect(distributionFault(parameter.distribution, parameter.measure)).toBeNull();
});
