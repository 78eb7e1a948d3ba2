import { tickDecimals, timeTicks, valueTicks } from '@/components/charts/geometry/ticks';

test('two days on a desk are marked by six hours, on a phone by twelve', () => {
  const desk = timeTicks([0, 172800], 1150, 76);
  const phone = timeTicks([0, 172800], 340, 76);
  expect(desk.values.map((s) => s / 3600)).toEqual([0, 6, 12, 18, 24, 30, 36, 42, 48]);
  expect(phone.values.map((s) => s / 3600)).toEqual([0, 12, 24, 36, 48]);
  expect(desk.unit).toBe('h');
});

test('a dam break of twenty minutes is told in minutes, one of 90 s in seconds', () => {
  expect(timeTicks([0, 1200], 400, 80)).toEqual({
    values: [0, 300, 600, 900, 1200],
    unit: 'min',
    unitSeconds: 60,
  });
  expect(timeTicks([0, 90], 400, 80).unit).toBe('s');
});

test('ticks lie in the extent and have the decimals that tell them apart', () => {
  expect(valueTicks([38, 46], 120, 26)).toEqual([38, 40, 42, 44, 46]);
  expect(tickDecimals([38, 40])).toBe(0);
  expect(tickDecimals([0, 0.05, 0.1])).toBe(2);
  expect(tickDecimals([1, 1.1])).toBe(1);
});

test('a run of months still has a handful of ticks', () => {
  const { values } = timeTicks([0, 200 * 86400], 340, 76);
  expect(values.length).toBeGreaterThan(1);
  expect(values.length).toBeLessThanOrEqual(6);
});
