import { bandPath, linePath } from '@/components/charts/geometry/paths';

test('a line through its points, to a tenth of a pixel', () => {
  expect(linePath([0, 10, 20], [5, 6.04, 7])).toBe('M0,5L10,6L20,7');
});

test('the pen is lifted where there is no value', () => {
  expect(linePath([0, 10, 20, 30, 40], [1, 2, NaN, 4, 5])).toBe('M0,1L10,2M30,4L40,5');
});

test('a band between two lines closes', () => {
  expect(bandPath([0, 10], [1, 2], [8, 9])).toBe('M0,1L10,2L10,9L0,8Z');
  expect(bandPath([0, 10], [1, 2], 20)).toBe('M0,1L10,2L10,20L0,20Z');
});
