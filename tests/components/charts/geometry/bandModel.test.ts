import { bandModel } from '@/components/charts/geometry/bandModel';
import { tornadoModel } from '@/components/charts/geometry/tornadoModel';

const size = { width: 400, height: 200 };
const data = {
  x: [0, 1800, 3600],
  line: [40, 42, 41],
  band: { low: [39.5, 41, 40.5], high: [40.5, 43, 41.5] },
};

test('the band, the curve and a level that matters all fit', () => {
  const { frame, xOf, yOf } = bandModel(
    size,
    { ...data, level: 44 },
    'time',
    'elevation',
    'metric',
  );
  const [low, high] = frame.y.domain();
  expect(low).toBeLessThanOrEqual(39.5);
  expect(high).toBeGreaterThanOrEqual(44);
  expect(xOf(0)).toBe(frame.left);
  expect(xOf(3600)).toBe(frame.right);
  expect(yOf(43)).toBeLessThan(yOf(42));
});

test('flows are drawn from zero, places in the units of the study', () => {
  const flow = bandModel(size, data, 'time', 'flow', 'metric');
  expect(flow.frame.y.domain()[0]).toBe(0);
  const along = bandModel(size, data, 'chainage', 'elevation', 'usCustomary');
  expect(along.frame.x.domain()[1]).toBeCloseTo(3600 / 0.3048, 6);
  expect(along.invert(along.frame.right)).toBeCloseTo(3600, 6);
  expect(along.timeTicks).toBeNull();
});

test('a tornado has the largest change first, and its line always on the paper', () => {
  const bar = (label: string, low: number | null, high: number | null) => ({
    label,
    low: { words: 'low', change: low },
    high: { words: 'high', change: high },
  });
  const { rows, extent } = tornadoModel([
    bar('small', 0.1, 0.2),
    bar('large', null, 0.9),
    bar('middle', 0.5, null),
  ]);
  expect(rows.map(({ label }) => label)).toEqual(['large', 'middle', 'small']);
  expect(extent).toEqual([0, 0.9]);
  expect(tornadoModel([bar('down', -0.3, -0.1)]).extent).toEqual([-0.3, 0]);
});
