import { placeLabel, type Box, type Polyline } from '@/components/charts/geometry/placeLabel';

const bounds = { x: 40, y: 0, width: 300, height: 160 };
const size = { width: 100, height: 16 };

/** Samples along every stretch of a line lie outside the box. */
function isClear(box: Box, { x, y }: Polyline): boolean {
  for (let i = 1; i < x.length; i++)
    for (let s = 0; s <= 1; s += 0.02) {
      const px = x[i - 1] + s * (x[i] - x[i - 1]);
      const py = y[i - 1] + s * (y[i] - y[i - 1]);
      if (px > box.x && px < box.x + box.width && py > box.y && py < box.y + box.height)
        return false;
    }
  return true;
}

const inside = (box: Box) =>
  box.x >= bounds.x &&
  box.y >= bounds.y &&
  box.x + box.width <= bounds.x + bounds.width &&
  box.y + box.height <= bounds.y + bounds.height;

/** A flood over the plot, rising to y = 24. */
const flood: Polyline = (() => {
  const x = Array.from({ length: 121 }, (_, i) => 40 + i * 2.5);
  return { x, y: x.map((px) => 150 - 126 * Math.exp(-(((px - 150) / 50) ** 2))) };
})();

test('wherever the cursor stands its reading is within the plot and off the curve and the cursor', () => {
  for (let i = 0; i < 121; i++) {
    const point = { x: flood.x[i], y: flood.y[i] };
    const cursor = { x: [point.x, point.x], y: [0, 160] };
    const box = placeLabel(point, size, bounds, { lines: [flood, cursor] });
    expect(inside(box)).toBe(true);
    expect(isClear(box, flood)).toBe(true);
    expect(isClear(box, cursor)).toBe(true);
  }
});

test('keeps off what is taken', () => {
  const taken = { x: 158, y: 60, width: 100, height: 40 };
  const box = placeLabel({ x: 150, y: 80 }, size, bounds, { lines: [], taken: [taken] });
  const apart =
    box.x >= taken.x + taken.width ||
    box.x + box.width <= taken.x ||
    box.y >= taken.y + taken.height ||
    box.y + box.height <= taken.y;
  expect(apart).toBe(true);
});

test('stays in the plot even where there is no free place', () => {
  const hatch = Array.from({ length: 40 }, (_, k) => ({ x: [0, 400], y: [k * 4, k * 4] }));
  expect(inside(placeLabel({ x: 150, y: 80 }, size, bounds, { lines: hatch }))).toBe(true);
});

test('crosses a cursor close beside the peak rather than leave its own side or lie on the curve', () => {
  const cursor = { x: [60, 60], y: [0, 160] };
  const steep = { x: [40, 44, 48, 60, 340], y: [150, 20, 40, 90, 148] };
  const box = placeLabel({ x: 44, y: 20 }, size, bounds, { lines: [steep], soft: [cursor] });
  expect(inside(box)).toBe(true);
  expect(isClear(box, steep)).toBe(true);
  expect(box.x).toBe(52);
});
