import {
  areaBelow,
  crestOverGround,
  levelAt,
  poolVolume,
  sectionNear,
} from '../../../shared/structures/crests';

/** A trapezoid: bed 10 m wide at 0, sides 2:1 up to 5 m. */
const channel = (chainage: number, bed = 0) => ({
  chainage,
  banks: null,
  points: [
    [-15, bed + 5],
    [-5, bed],
    [5, bed],
    [15, bed + 5],
  ] as [number, number][],
});

test('a crest is level in the channel and follows higher ground', () => {
  expect(crestOverGround(channel(0), 2)).toEqual([
    [-15, 5],
    [-9, 2],
    [9, 2],
    [15, 5],
  ]);
  expect(crestOverGround(channel(0), 6)).toEqual([
    [-15, 6],
    [15, 6],
  ]);
});
test('the level of a crest at an offset', () => {
  expect(levelAt(crestOverGround(channel(0), 2), -12)).toBeCloseTo(3.5, 12);
});
test('the area below a level is that of the trapezoid', () => {
  // (10 + 18)/2 x 2 and, to its top, (10 + 30)/2 x 5; above the ends there are walls.
  expect(areaBelow(channel(0), 2)).toBeCloseTo(28, 12);
  expect(areaBelow(channel(0), 5)).toBeCloseTo(100, 12);
  expect(areaBelow(channel(0), 6)).toBeCloseTo(130, 12);
  expect(areaBelow(channel(0), -1)).toBe(0);
});
test('the section at a place has the bed of that place', () => {
  const { points } = sectionNear([channel(0, 10), channel(1000, 8)], 400);
  expect(Math.min(...points.map(([, z]) => z))).toBeCloseTo(9.2, 12);
});
test('a pool in a level prism holds its area times its length', () => {
  const reach = [channel(0), channel(500), channel(1000)];
  expect(poolVolume(reach, 800, 2)).toBeCloseTo(28 * 800, 8);
});
