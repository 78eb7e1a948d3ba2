import { levelResult } from '../../shared/runs/levelResult';

const H = 3600;
const station = { id: 1, name: 'Sallow Mill', chainage: 700 };
const level = (at: number) => ({ kind: 'floor' as const, level: at, note: '' });
/** Rises 1 m an hour from 10 m to 13 m, and falls as fast; the true peak lies between two moments. */
const stage = {
  times: [0, 1, 2, 3, 4, 5, 6].map((h) => h * H),
  stage: [10, 11, 12, 13, 12, 11, 10],
  peakStage: 13.05,
  peakStageTime: 3.1 * H,
};

test('below the peak: freeboard is negative, passed on the way up, for as long as both limbs stand above', () => {
  const { freeboard, passedAt, passedFor } = levelResult(station, level(11.5), stage);
  expect(freeboard).toBeCloseTo(-1.55, 12);
  expect(passedAt).toBeCloseTo(1.5 * H, 9);
  expect(passedFor).toBeCloseTo(3 * H, 9);
});

test('above the peak: never passed', () => {
  expect(levelResult(station, level(13.8), stage)).toMatchObject({ passedAt: null, passedFor: 0 });
});

test('a peak between the stored moments counts, at its own time', () => {
  const result = levelResult(station, level(13.02), stage);
  expect(result.freeboard).toBeCloseTo(-0.03, 12);
  expect(result).toMatchObject({ passedAt: 3.1 * H, passedFor: 0 });
});
