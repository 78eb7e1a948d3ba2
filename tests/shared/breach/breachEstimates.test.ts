import {
  bottomWidthOf,
  breachEstimates,
  peakEstimates,
  type DamInputs,
} from '../../../shared/breach/breachEstimates';
import { METRES_PER_FOOT } from '../../../shared/units/units';

const ACRE_FOOT = 43_560 * METRES_PER_FOOT ** 3;
const CUBIC_YARD = (3 * METRES_PER_FOOT) ** 3;

/** Jamestown Dam at the top of its joint-use pool: T. L. Wahl (2001), tables 2 to 4. */
const jamestown: DamInputs = {
  waterDepth: 42.67 * METRES_PER_FOOT,
  breachHeight: 81 * METRES_PER_FOOT,
  damHeight: 81 * METRES_PER_FOOT,
  waterVolume: 37_000 * ACRE_FOOT,
  storage: 37_000 * ACRE_FOOT,
  failure: 'piping',
  embankment: 'earthfill',
  erodibility: 'low',
  crestWidth: 10,
  faceSlopes: 5,
};
const of = (id: string, inputs = jamestown) =>
  breachEstimates(inputs).find((one) => one.id === id)!;

test.each([
  ['froehlich1995', 307, 1.63],
  ['vonThunGillette1990.depth', 287, 0.51],
  ['usbr1988', 128, 0.43],
] as const)('%s against the published example: width in ft, time in h', (id, width, hours) => {
  const { width: found, formationTime } = of(id);
  expect(found!.value / METRES_PER_FOOT / width).toBeCloseTo(1, 2);
  expect(Math.abs(formationTime!.value / 3600 / hours - 1)).toBeLessThan(0.01);
});
test('bands of the uncertainty stand around the value as published (Wahl 2001, table 1)', () => {
  const { width, formationTime } = of('froehlich1995');
  expect(width!.band).toEqual([0.4 * width!.value, 2.4 * width!.value]);
  expect(formationTime!.band).toEqual([0.38 * formationTime!.value, 7.3 * formationTime!.value]);
  expect(of('froehlich2008').width!.band).toBeNull();
});
test('width from the eroded volume: 191,000 cubic yards (Wahl 2001) over the section of the dam', () => {
  const { breachHeight, crestWidth, faceSlopes } = jamestown;
  const across = breachHeight * (crestWidth! + 0.5 * breachHeight * faceSlopes!);
  const volume = of('macDonald1984').width!.value * across;
  expect(volume / CUBIC_YARD / 191_000).toBeCloseTo(1, 2);
  expect(of('macDonald1984', { ...jamestown, crestWidth: null }).width).toBeNull();
});
test('side slopes follow the way it fails', () => {
  const over = { ...jamestown, failure: 'overtopping' } as const;
  expect([of('froehlich2008').sideSlope, of('froehlich2008', over).sideSlope]).toEqual([0.7, 1]);
  expect([of('froehlich1995').sideSlope, of('froehlich1995', over).sideSlope]).toEqual([0.9, 1.4]);
  expect(of('usbr1988').sideSlope).toBeNull();
});
test('the bottom of a breach is narrower than its average', () => {
  expect(bottomWidthOf(40, 1, 10)).toBe(30);
});
test('peak flows carry their bands', () => {
  const froehlich = peakEstimates(jamestown).find(({ id }) => id === 'peak.froehlich1995')!;
  // 93,800 ft³/s published.
  expect(froehlich.value / METRES_PER_FOOT ** 3 / 93_800).toBeCloseTo(1, 2);
  expect(froehlich.band![1] / froehlich.value).toBeCloseTo(2.3, 12);
});
