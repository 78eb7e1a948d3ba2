import { createLaterals } from '../../../server/solvers/sources/laterals';
import { createSeries } from '../../../server/solvers/sources/series';
import { createLimitOutflow } from '../../../server/solvers/time/limitOutflow';
import { outputTimes, stepTowards } from '../../../server/solvers/time/outputTimes';
import { rootNear } from '../../../server/solvers/boundaries/rootNear';
import { createRatingCurve } from '../../../server/solvers/boundaries/ratingCurve';
import { at, kernelParts } from './kernelParts';
import { rectangle } from './sections';

describe('a series', () => {
  it('is linear between its values and held outside, asked in any order', () => {
    const series = createSeries([0, 10, 30], [5, 15, -5]);
    expect([5, -1, 25, 10, 31, 0, 20].map(series)).toEqual([10, 5, 0, 15, -5, 5, 5]);
  });

  it('can be one value', () => {
    expect(createSeries([7], [3])(100)).toBe(3);
  });
});

describe('output times', () => {
  it('hold the start, every interval and the end', () => {
    expect(outputTimes(10, 4)).toEqual([0, 4, 8, 10]);
    expect(outputTimes(8, 4)).toEqual([0, 4, 8]);
    expect(outputTimes(1, 4)).toEqual([0, 1]);
    expect(outputTimes(0.3, 0.1)).toHaveLength(4);
  });

  it('are met exactly and without slivers', () => {
    expect(stepTowards(0, 10, 20)).toBe(10);
    expect(stepTowards(0, 10, 9.9)).toBe(5);
    expect(stepTowards(0, 10, 3)).toBe(3);
  });
});

describe('the limit of outflow', () => {
  it('gives away what is there and keeps the volume', () => {
    const { workspace, state } = kernelParts(at(rectangle(1), 0), at(rectangle(1), 30), 3);
    state.place(1, 1);
    state.place(2, 0.2);
    state.place(3, 1);
    workspace.fluxArea.set([0, 0.1, 0.5, 0]);
    workspace.fluxArea[1] = -0.5;
    const dt = 10;
    createLimitOutflow(workspace)(dt);
    const [, left, right] = workspace.fluxArea;
    // 0.2 m² on 10 m last 10 s at 0.2 m³/s, shared between both sides.
    expect(left).toBeCloseTo(-0.1, 12);
    expect(right).toBeCloseTo(0.1, 12);
  });
});

describe('lateral inflow', () => {
  const grid = {
    cells: 10,
    dx: 10,
    start: 100,
    chainage: new Float64Array(0),
    bed: new Float64Array(0),
  };

  it('spreads over its stretch by length', () => {
    const laterals = createLaterals([{ from: 115, to: 135, times: [0, 10], flows: [0, 4] }], grid);
    laterals.setTime(5);
    expect([...laterals.rate.slice(1, 6)]).toEqual([0, 0.5, 1, 0.5, 0]);
    expect(laterals.totalAbove(125, 10)).toBe(2);
  });

  it('goes into one cell at a point, the last one at the end', () => {
    const laterals = createLaterals(
      [
        { from: 120, to: 120, times: [0], flows: [1] },
        { from: 200, to: 200, times: [0], flows: [-2] },
      ],
      grid,
    );
    laterals.setTime(0);
    expect(laterals.rate[3]).toBe(1);
    expect(laterals.rate[10]).toBe(-2);
    expect([...laterals.rate].reduce((a, b) => a + b)).toBe(-1);
  });
});

describe('the search for a rising root', () => {
  it.each([-40, 0, 0.1, 3, 900])('finds it from a guess of %d', (guess) => {
    const root = rootNear((x) => x ** 3 - 27, 0, guess, 0.01);
    expect(root).toBeCloseTo(3, 12);
  });

  it('stays at the floor where the function is above', () => {
    expect(rootNear((x) => x + 1, 2, 5, 0.1)).toBe(2);
  });
});

describe('a rating curve', () => {
  it('starts at the bed, is linear, and goes on along its last line', () => {
    const rating = createRatingCurve([2, 4], [10, 50], 1);
    expect([0, 1, 1.5, 2, 3, 4, 5].map(rating)).toEqual([0, 0, 5, 10, 30, 50, 70]);
  });
});
