import { thinSeries } from '@/components/charts/geometry/thinSeries';

test('a short series is left alone', () => {
  expect(thinSeries([0, 1, 2], [5, 6, 7], 10)).toEqual({ x: [0, 1, 2], y: [5, 6, 7] });
});

test('no extreme of a long one is lost, its ends stay and time never goes back', () => {
  const n = 20_000;
  const x = Array.from({ length: n }, (_, i) => i);
  const y = x.map((i) => Math.sin(i / 700) + (i === 7777 ? 9 : 0) - (i === 12_345 ? 9 : 0));
  const thin = thinSeries(x, y, 300);
  expect(thin.x.length).toBeLessThanOrEqual(1200);
  expect(Math.max(...thin.y)).toBe(Math.max(...y));
  expect(Math.min(...thin.y)).toBe(Math.min(...y));
  expect([thin.x[0], thin.x.at(-1)]).toEqual([0, n - 1]);
  expect(thin.x.every((value, i) => i === 0 || value > thin.x[i - 1])).toBe(true);
});
