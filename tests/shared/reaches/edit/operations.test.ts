import { insertPoint } from '@/shared/reaches/edit/insertPoint';
import { movePoint } from '@/shared/reaches/edit/movePoint';
import { pastePoints } from '@/shared/reaches/edit/pastePoints';
import { proposeBanks } from '@/shared/reaches/edit/proposeBanks';
import { reverseOffsets } from '@/shared/reaches/edit/reverseOffsets';
import { shiftDatum } from '@/shared/reaches/edit/shiftDatum';
import { thinningCost, thinPoints } from '@/shared/reaches/edit/thinPoints';
import { withPoints } from '@/shared/reaches/edit/withPoints';
import type { Section } from '@/shared/surveys/types';
import { plainSections } from '../../../helpers/plainSections';

/** Bed 10 to 13 over the banks at 20 and 38 m; laid out along a line that runs due east from (1000, 2000). */
const section = (): Section => ({
  ...plainSections()[0],
  coordinates: plainSections()[0].points.map(([y]) => [1000 + y, 2000]),
});
const full = (): Section => ({
  ...section(),
  storage: [{ from: 0, to: 10, flowsAbove: 15 }],
  embankments: { left: { offset: 20, crest: 13.8 }, right: { offset: 45, crest: 14 } },
});

describe('moving a point', () => {
  test('it takes with it what stands on it, and its coordinate', () => {
    const moved = movePoint(full(), 2, [18, 13.1]);
    expect(moved.points[2]).toEqual([18, 13.1]);
    expect(moved.banks).toEqual([18, 38]);
    expect(moved.roughness[1]).toEqual([18, 0.035]);
    expect(moved.embankments?.left).toEqual({ offset: 18, crest: 13.8 });
    expect(moved.storage).toEqual([{ from: 0, to: 10, flowsAbove: 15 }]);
    expect(moved.coordinates?.[2]).toEqual([1018, 2000]);
    expect(moved.points[1]).toEqual(full().points[1]);
  });

  test('it never passes a neighbour', () => {
    expect(movePoint(section(), 3, [5, 11]).points[3]).toEqual([20, 11]);
    expect(movePoint(section(), 3, [500, 11]).points[3]).toEqual([32, 11]);
  });

  test('of a wall only one end moves, and the bank stays with the other', () => {
    const wall = withPoints(section(), [
      [0, 16],
      [20, 13],
      [20, 10],
      [38, 10],
      [58, 16],
    ]);
    expect(movePoint(wall, 2, [22, 10]).banks).toEqual([20, 38]);
  });
});

test('a new point stands half way on the ground; after the last, beyond it', () => {
  expect(insertPoint(section(), 2).points[3]).toEqual([23, 11.5]);
  expect(insertPoint(section(), 2).coordinates?.[3]).toEqual([1023, 2000]);
  expect(insertPoint(section(), 7).points[8]).toEqual([68, 16]);
});

test('pasted rows are set over what is there, and added beyond the last', () => {
  const rows = [
    [50, 13.4],
    [60, 16.2],
    [70, 17],
  ];
  const pasted = pastePoints(section(), 6, rows, 'both');
  expect(pasted.points.slice(5)).toEqual([[38, 13], ...rows]);
  // 12 m beyond the old end on the same line.
  expect(pasted.coordinates?.[8]).toEqual([1070, 2000]);
  const levels = pastePoints(section(), 6, [[14], [17], [18]], 'elevation');
  expect(levels.points.slice(6)).toEqual([
    [48, 14],
    [58, 17],
  ]);
});

test('points that leave the ends behind take roughness to the new ends', () => {
  const wider = withPoints(section(), [[-5, 18], ...section().points]);
  expect(wider.roughness[0]).toEqual([-5, 0.06]);
  const narrower = withPoints(section(), section().points.slice(0, 5));
  expect(narrower.roughness).toEqual([
    [0, 0.06],
    [20, 0.035],
  ]);
});

test('a datum is shifted with all that is a level, and back to the last digit', () => {
  const up = shiftDatum(full(), 0.35);
  expect(up.points.map(([, z]) => z)).toEqual([
    16.35, 13.55, 13.35, 10.35, 10.35, 13.35, 13.55, 16.35,
  ]);
  expect(up.storage![0].flowsAbove).toBe(15.35);
  expect(up.embankments).toEqual({
    left: { offset: 20, crest: 14.15 },
    right: { offset: 45, crest: 14.35 },
  });
  expect(shiftDatum(up, -0.35)).toEqual(full());
});

test('left and right are exchanged within the same span; twice gives what was there', () => {
  const uneven = { ...full(), banks: [20, 40] as [number, number] };
  const turned = reverseOffsets(uneven);
  expect(turned.points[0]).toEqual([0, 16]);
  expect(turned.points[2]).toEqual([20, 13]);
  // 58 m wide: what was 40 from the left stands 18 from it.
  expect(turned.banks).toEqual([18, 38]);
  expect(turned.roughness).toEqual([
    [0, 0.06],
    [20, 0.035],
    [38, 0.06],
  ]);
  expect(turned.storage).toEqual([{ from: 48, to: 58, flowsAbove: 15 }]);
  expect(turned.embankments).toEqual({
    left: { offset: 13, crest: 14 },
    right: { offset: 38, crest: 13.8 },
  });
  expect(turned.coordinates![0]).toEqual([1058, 2000]);
  expect(reverseOffsets(turned)).toEqual(uneven);
});

describe('thinning', () => {
  /** A V of 1 in 1, 10 m deep, with a bump 0.3 m up at a quarter and one 0.05 m up at three quarters. */
  const bumpy: Section = {
    ...section(),
    banks: null,
    roughness: [[0, 0.04]],
    points: [
      [0, 10],
      [5, 5.3],
      [10, 0],
      [15, 5.05],
      [20, 10],
    ],
  };

  test('a point within the tolerance of the line is left out, one beyond it stays', () => {
    // Upright to a 45° line: 0.3/√2 = 0.212 m and 0.05/√2 = 0.035 m.
    const offsets = (tolerance: number) => thinPoints(bumpy, tolerance).points.map(([y]) => y);
    expect(offsets(0.03)).toEqual([0, 5, 10, 15, 20]);
    expect(offsets(0.04)).toEqual([0, 5, 10, 20]);
    expect(offsets(0.21)).toEqual([0, 5, 10, 20]);
    expect(offsets(0.22)).toEqual([0, 10, 20]);
  });

  test('its cost is the area of the triangles that are cut off', () => {
    // By hand: a bump of h over a base of 10 m takes h·10/2 m² of a V of 100 m².
    const cost = thinningCost(bumpy, thinPoints(bumpy, 0.22));
    expect(cost).toMatchObject({ pointsBefore: 5, pointsAfter: 3, level: 10 });
    expect(cost.areaChange).toBeCloseTo(1.5 + 0.25, 10);
    expect(cost.relative).toBeCloseTo(1.75 / 98.25, 10);
  });

  test('what something stands on is kept, and the other points keep their coordinates', () => {
    const marked = { ...bumpy, banks: [5, 15] as [number, number] };
    expect(thinPoints(marked, 5).points).toEqual(bumpy.points);
    const thinned = thinPoints(section(), 0.2);
    expect(thinned.coordinates).toEqual(thinned.points.map(([y]) => [1000 + y, 2000]));
  });
});

describe('banks are proposed where width over depth is least', () => {
  test('on a trapezoid with floodplains', () => {
    // By hand at 13 m: T²/A = 18²/36 = 9; at 13.2 m: T 38 m, A 36 + 3.6 + 2 m², T²/A 34.7.
    expect(proposeBanks({ ...section(), banks: null })).toEqual({ banks: [20, 38], stage: 13 });
  });

  test('on the higher bank the mark stands on the first point above the stage', () => {
    const uneven = withPoints(section(), [
      [0, 16],
      [20, 13],
      [26, 10],
      [32, 10],
      [40, 14],
      [50, 14.2],
      [58, 16],
    ]);
    expect(proposeBanks(uneven)).toEqual({ banks: [20, 40], stage: 13 });
  });

  test('a ditch behind the bank is not in the channel', () => {
    const ditch = withPoints(section(), [
      [0, 16],
      [4, 11],
      [8, 11],
      [20, 13],
      [26, 10],
      [32, 10],
      [38, 13],
      [48, 13.2],
      [58, 16],
    ]);
    expect(proposeBanks(ditch)?.banks).toEqual([20, 38]);
  });

  test('a channel without floodplains has none to tell', () => {
    const bare = withPoints(section(), [
      [20, 13],
      [26, 10],
      [32, 10],
      [38, 13],
    ]);
    expect(proposeBanks(bare)).toBeNull();
  });
});
