import { extentOf, makeFrame, roomyExtent } from '@/components/charts/geometry/frame';

test('data meet pixels at the corners of the plot, elevation upwards', () => {
  const frame = makeFrame(
    { width: 400, height: 200 },
    { top: 10, right: 20, bottom: 30, left: 40 },
    [0, 21.4],
    [20, 60],
  );
  expect([frame.x(0), frame.x(21.4)]).toEqual([40, 380]);
  expect([frame.y(20), frame.y(60)]).toEqual([170, 10]);
});

test('extent runs over all rows and passes over what is not a number', () => {
  expect(extentOf([3, NaN, 7], Float32Array.of(-2, 5))).toEqual([-2, 7]);
  expect(extentOf([])).toBeNull();
  expect(extentOf([NaN])).toBeNull();
});

test('a level pool gets the least height about its level, a flood ends on round numbers', () => {
  const [low, high] = roomyExtent([10.001, 10.002], 1);
  expect(high - low).toBeGreaterThanOrEqual(1);
  expect(low).toBeLessThan(10);
  expect(high).toBeGreaterThan(10.003);
  expect(roomyExtent([38.1, 44.66], 1)).toEqual([38, 45]);
});
