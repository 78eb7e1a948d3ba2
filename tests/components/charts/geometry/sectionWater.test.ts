import { sectionWater, wetWidth } from '@/components/charts/geometry/sectionWater';

/** V-shaped channel, 20 m wide at 10 m, its lowest point at elevation 0. */
const channel = [
  [0, 10],
  [10, 0],
  [20, 10],
] as const;

/** Area of a ring by the shoelace formula, m². */
const area = (ring: [number, number][]) =>
  Math.abs(
    ring.reduce((sum, [x, y], i) => {
      const [nx, ny] = ring[(i + 1) % ring.length];
      return sum + x * ny - nx * y;
    }, 0) / 2,
  );

test('the water of a triangle has the width and area of the triangle', () => {
  const rings = sectionWater(channel, 4);
  expect(rings).toHaveLength(1);
  expect(rings[0][0]).toEqual([6, 4]);
  expect(rings[0].at(-1)).toEqual([14, 4]);
  expect(wetWidth(rings)).toBeCloseTo(8, 12);
  expect(area(rings[0])).toBeCloseTo(16, 12);
});

test('dry at and below the lowest point', () => {
  expect(sectionWater(channel, 0)).toEqual([]);
  expect(sectionWater(channel, -3)).toEqual([]);
});

test('above its ends a section has walls', () => {
  const rings = sectionWater(channel, 12);
  expect(wetWidth(rings)).toBe(20);
  expect(area(rings[0])).toBeCloseTo(100 + 2 * 20, 12);
});

test('two low places hold two waters until the ridge between them is under', () => {
  const twin = [
    [0, 5],
    [5, 0],
    [10, 3],
    [15, 1],
    [20, 5],
  ] as const;
  expect(sectionWater(twin, 2)).toHaveLength(2);
  expect(sectionWater(twin, 3.5)).toHaveLength(1);
});

test('a vertical wall is a shore', () => {
  const box = [
    [0, 5],
    [0, 0],
    [8, 0],
    [8, 5],
  ] as const;
  const rings = sectionWater(box, 2);
  expect(wetWidth(rings)).toBe(8);
  expect(area(rings[0])).toBeCloseTo(16, 12);
});
