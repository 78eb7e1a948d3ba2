import { longSectionFrame, wetSurface } from '@/components/charts/geometry/longProfile';

const profile = {
  chainages: [0, 10_000, 21_400],
  bed: [48.3, 37, 26],
  leftBank: [52, 41, 30],
  peakStage: [54.6, 44.66, 31.8],
};
const size = { width: 720, height: 320 };

test('bed, banks and the highest water all fit, with ground below the bed', () => {
  const { y, top, bottom } = longSectionFrame(size, profile, 'metric');
  expect(y(54.6)).toBeGreaterThanOrEqual(top);
  expect(y(26)).toBeLessThan(bottom - 10);
});

test('chainage is told in the units of the study', () => {
  expect(longSectionFrame(size, profile, 'metric').x.domain()).toEqual([0, 21.4]);
  const feet = longSectionFrame(size, profile, 'usCustomary').x.domain();
  // 1 ft = 0.3048 m exactly (NIST SP 811).
  expect(feet[1]).toBeCloseTo(21_400 / 0.3048, 6);
});

test('dry ground has no surface', () => {
  expect(Array.from(wetSurface([1, 2, 3], [1, 2.5, 3.001]))).toEqual([NaN, 2.5, NaN]);
});
