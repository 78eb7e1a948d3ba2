import { bracket, nearestIndex, valueAt } from '@/components/charts/geometry/interpolate';

const x = [0, 10, 20, 40];

test('linear between, held outside, exact at the given values', () => {
  const y = [1, 2, 0, 4];
  expect([-5, 0, 5, 10, 30, 40, 99].map((at) => valueAt(x, y, at))).toEqual([
    1, 1, 1.5, 2, 2, 4, 4,
  ]);
});

test('a sudden step takes the value after it', () => {
  expect(valueAt([0, 10, 10, 20], [1, 1, 5, 5], 10)).toBe(5);
});

test('nothing and a single value', () => {
  expect(valueAt([], [], 3)).toBeNaN();
  expect(valueAt([2], [7], 3)).toBe(7);
  expect(nearestIndex([], 3)).toBe(-1);
  expect(nearestIndex([2], 3)).toBe(0);
});

test('every entry is its own bracket and its own nearest', () => {
  const row = Array.from({ length: 500 }, (_, i) => i * 43 + Math.sin(i));
  row.forEach((value, i) => {
    expect(bracket(row, value)).toBe(Math.min(i, row.length - 2));
    expect(nearestIndex(row, value)).toBe(i);
  });
});
