import { flatnessOf, trialsAlong } from '../../../shared/calibration/search/flatness';

const bounds = { low: 0.5, high: 2 };

test('tries both sides of the best within the bounds', () => {
  expect(trialsAlong(1, bounds)).toEqual([0.8, 0.9, 1.1, 1.25]);
  // 1.9 × 1.1 and × 1.25 both end at the bound.
  expect(trialsAlong(1.9, bounds).map((x) => Number(x.toFixed(3)))).toEqual([1.52, 1.71, 2]);
  expect(trialsAlong(2, bounds)).toEqual([1.6, 1.8]);
});

test('curvature of a parabola in the logarithm is given back exactly', () => {
  // J² = 0.25 + 3 u², u = ln(m): second derivative 6.
  const misfit = (m: number) => Math.sqrt(0.25 + 3 * Math.log(m) ** 2);
  const points = [0.8, 0.9, 1.1, 1.25].map((factor) => ({ factor, misfit: misfit(factor) }));
  const flat = flatnessOf(points, { factor: 1, misfit: 0.5 }, bounds);
  expect(flat.curvature).toBeCloseTo(6, 9);
  expect(flat.factors).toEqual([0.8, 0.9, 1, 1.1, 1.25]);
  expect(flat.atBound).toBeNull();
});

test('the range ends where the misfit is a tenth of the tolerance above the best, or is open', () => {
  const points = [
    { factor: 0.8, misfit: 0.9 },
    { factor: 0.9, misfit: 0.5 },
    { factor: 1.1, misfit: 0.51 },
    { factor: 1.25, misfit: 0.54 },
  ];
  const { range } = flatnessOf(points, { factor: 1, misfit: 0.5 }, bounds);
  // 0.6 lies a quarter of the way from 0.5 at 0.9 to 0.9 at 0.8.
  expect(range).toEqual({
    low: expect.closeTo(0.875, 9),
    high: 1.25,
    lowOpen: false,
    highOpen: true,
  });
});

test('a failed trial is left out, and a best on its bound is told', () => {
  const points = [
    { factor: 1.6, misfit: 1 },
    { factor: 1.8, misfit: null },
  ];
  const flat = flatnessOf(points, { factor: 2, misfit: 0.5 }, bounds);
  expect(flat.misfit).toEqual([1, null, 0.5]);
  expect(flat.curvature).toBeNull();
  expect(flat.atBound).toBe('high');
});
