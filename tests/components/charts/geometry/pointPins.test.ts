import { makeFrame } from '@/components/charts/geometry/frame';
import { pointPins } from '@/components/charts/geometry/pointPins';

const frame = makeFrame(
  { width: 300, height: 200 },
  { top: 20, right: 10, bottom: 30, left: 40 },
  [0, 1],
  [0, 1],
);

test('stands above what it points to', () => {
  expect(pointPins([{ id: 7, x: 120, y: 100 }], frame)).toEqual([
    { id: 7, x: 120, y: 76, footX: 120, footY: 100 },
  ]);
});

test('many on one place can each be pressed: none lies on another, all within the plot', () => {
  const points = Array.from({ length: 9 }, (_, id) => ({ id, x: 280, y: 60 }));
  const pins = pointPins(points, frame);
  expect(pins).toHaveLength(9);
  for (const [k, pin] of pins.entries()) {
    expect(pin.x - 12).toBeGreaterThanOrEqual(28);
    expect(pin.x + 12).toBeLessThanOrEqual(290);
    expect(pin.y).toBeGreaterThanOrEqual(29);
    for (const other of pins.slice(k + 1))
      expect(Math.max(Math.abs(pin.x - other.x), Math.abs(pin.y - other.y))).toBeGreaterThanOrEqual(
        24,
      );
  }
});

test('at the foot of the plot it stays within it', () => {
  const [pin] = pointPins([{ id: 1, x: 41, y: 169 }], frame);
  expect(pin.y).toBe(145);
  expect(pin.x).toBe(52);
});

test('a name is not covered', () => {
  const name = { x: 60, y: 66, width: 80, height: 15 };
  const [pin] = pointPins([{ id: 1, x: 120, y: 100 }], frame, [name]);
  expect(pin).toMatchObject({ x: 120, y: 52 });
  const [low] = pointPins([{ id: 1, x: 120, y: 60 }], frame, [{ ...name, y: 25 }]);
  expect(low.y).toBe(36);
  expect(low.x - 9).toBeGreaterThanOrEqual(140);
});
