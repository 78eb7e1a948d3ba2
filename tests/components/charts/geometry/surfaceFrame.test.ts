import { surfaceFrame, surfaceLevel } from '@/components/charts/geometry/surfaceFrame';

const surface = {
  places: 3,
  moments: 3,
  times: Float64Array.of(0, 100, 400),
  stage: Float32Array.of(10, 9, 8, 12, 9.5, 8, 11, 10, 9),
};

test('the surface at, between and outside the stored moments', () => {
  const at = (t: number) => Array.from(surfaceFrame(surface, t, new Float32Array(3)));
  expect(at(100)).toEqual([12, 9.5, 8]);
  expect(at(50)).toEqual([11, 9.25, 8]);
  expect(at(250)).toEqual([11.5, 9.75, 8.5]);
  expect(at(-1)).toEqual([10, 9, 8]);
  expect(at(1e9)).toEqual([11, 10, 9]);
});

test('writes into what it is given', () => {
  const out = new Float32Array(3);
  expect(surfaceFrame(surface, 0, out)).toBe(out);
});

test('one moment alone is held; none is no water', () => {
  const still = { ...surface, moments: 1, times: Float64Array.of(0) };
  expect(Array.from(surfaceFrame(still, 77, new Float32Array(3)))).toEqual([10, 9, 8]);
  const none = { ...surface, moments: 0 };
  expect(surfaceFrame(none, 77, new Float32Array(3)).every(Number.isNaN)).toBe(true);
});

test('the level at one place is the frame read at that place', () => {
  const along = { ...surface, chainages: [0, 100, 300] };
  expect(surfaceLevel(along, 50, 100)).toBe(9.25);
  expect(surfaceLevel(along, 50, 50)).toBe((11 + 9.25) / 2);
  expect(surfaceLevel(along, 1e9, 200)).toBe(9.5);
});
