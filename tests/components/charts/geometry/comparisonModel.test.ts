import { comparisonModel } from '@/components/charts/geometry/comparisonModel';
import type { CaseCurves } from '@/shared/verificationCases/types';

const SIZE = { width: 400, height: 200 };
const n = 400;
const at = Array.from({ length: n }, (_, i) => i + 0.5);
const step = at.map((x) => (x < 200 ? 4 : 1));
const curves: CaseCurves = {
  along: 'chainage',
  at,
  bed: at.map(() => 0),
  stage: { computed: step, exact: step },
  flow: { computed: at.map(() => 20), exact: at.map(() => 20 + 1e-9) },
  leftOut: [[150, 250]],
};

test('computed values are few enough to be told apart, and none of a leap is lost', () => {
  const { dots, frame } = comparisonModel(SIZE, curves, 'stage');
  expect(dots.length).toBeLessThan(50);
  expect(dots.length).toBeGreaterThan(30);
  const leap = dots.findIndex(({ y }, i) => i > 0 && y > dots[i - 1].y);
  expect(dots[leap].y).toBeCloseTo(frame.y(1), 6);
  for (const { x, y } of dots) {
    expect(x).toBeGreaterThanOrEqual(frame.left);
    expect(x).toBeLessThanOrEqual(frame.right);
    expect(y).toBeGreaterThanOrEqual(frame.top);
    expect(y).toBeLessThanOrEqual(frame.bottom);
  }
});

test('stage stands over its ground, flow from zero; rounding is not drawn as a wave', () => {
  const stage = comparisonModel(SIZE, curves, 'stage');
  expect(stage.ground).not.toBe('');
  expect(stage.water).not.toBe('');
  const flow = comparisonModel(SIZE, curves, 'flow');
  expect(flow.ground).toBe('');
  expect(flow.frame.y.domain()[0]).toBe(0);
  const ys = flow.dots.map(({ y }) => y);
  expect(Math.max(...ys) - Math.min(...ys)).toBeLessThan(0.1);
});

test('the stretch that the norms leave out is marked where it lies', () => {
  const { frame, leftOut } = comparisonModel(SIZE, curves, 'stage');
  expect(leftOut).toEqual([[frame.x(150), frame.x(250)]]);
});

test('along time there is no ground, and the ticks count time', () => {
  const alongTime: CaseCurves = { ...curves, along: 'time', bed: null, leftOut: [] };
  const { time, ground } = comparisonModel(SIZE, alongTime, 'stage');
  expect(time!.unit).toBe('min');
  expect(ground).toBe('');
});
