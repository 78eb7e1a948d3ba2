import { ROUGHNESS_RANGE, ROUGHNESS_TABLE } from '../../../shared/reaches/roughnessTable';
import {
  bankfullStage,
  bankfullWidth,
  bankLevels,
  groundAt,
  thalwegOf,
  topWidthAt,
} from '../../../shared/reaches/sectionGeometry';
import type { Section } from '../../../shared/surveys/types';

/** A trapezoid with a wall on its right and lower ground behind it. */
const section: Pick<Section, 'points' | 'banks'> = {
  points: [
    [0, 14],
    [10, 12],
    [14, 8],
    [20, 8],
    [20, 13],
    [30, 9],
    [40, 15],
  ],
  banks: [10, 20],
};

test('levels by hand', () => {
  expect(thalwegOf(section)).toBe(8);
  expect(bankLevels(section)).toEqual([12, 13]);
  expect(bankLevels({ ...section, banks: null })).toEqual([14, 15]);
  expect(bankfullStage(section)).toBe(12);
});
test('ground between points, at a wall, and beyond the ends', () => {
  expect([5, 12, 20, 25, -3, 99].map((y) => groundAt(section, y))).toEqual([
    13, 10, 13, 11, 14, 15,
  ]);
});
test('width of the water by hand', () => {
  expect(topWidthAt(section, 8)).toBe(6);
  expect(topWidthAt(section, 10)).toBeCloseTo(8 + 2.5 + 10 / 6, 12);
  expect(topWidthAt(section, 10, [10, 20])).toBe(8);
  expect(bankfullWidth(section)).toBe(10);
  expect(topWidthAt(section, 7)).toBe(0);
});

describe("the published table of Manning's n", () => {
  // Chow (1959), Open-Channel Hydraulics, table 5-6. Rows of natural streams and flood plains as read at
  // vista.ir/m/c/mf8qk; the others from memory.
  test.each([
    ['Clean, straight, full stage, no rifts or deep pools', 0.025, 0.03, 0.033],
    ['Very weedy, deep pools, heavy stand of timber and underbrush', 0.075, 0.1, 0.15],
    ['Cobbles with large boulders', 0.04, 0.05, 0.07],
    ['Pasture, short grass', 0.025, 0.03, 0.035],
    ['Scattered brush, heavy weeds', 0.035, 0.05, 0.07],
    ['Concrete, trowel finish', 0.011, 0.013, 0.015],
    ['Irregular and rough section', 0.035, null, 0.1],
  ])('%s', (description, min, normal, max) => {
    expect(ROUGHNESS_TABLE.find((row) => row.description === description)).toMatchObject({
      min,
      normal,
      max,
    });
  });
  test('has every row once, with its values in order', () => {
    expect(ROUGHNESS_TABLE).toHaveLength(49);
    expect(new Set(ROUGHNESS_TABLE.map(({ group, description }) => group + description)).size).toBe(
      49,
    );
    for (const { min, normal, max } of ROUGHNESS_TABLE) {
      expect(min).toBeLessThan(max);
      if (normal !== null) expect(min <= normal && normal <= max).toBe(true);
    }
    expect(ROUGHNESS_RANGE).toEqual({ min: 0.011, max: 0.2 });
  });
});
