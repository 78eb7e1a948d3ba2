import { curveSetModel } from '@/components/charts/geometry/curveSetModel';

const size = { width: 400, height: 200 };

test('the bars of observed points and the ground fit into the drawing', () => {
  const { curves, frame, ground } = curveSetModel(size, {
    curves: [
      { name: 'Computed', x: [0, 1000], y: [12, 11], look: 0 },
      { name: 'Marks', x: [500], y: [11.4], reach: [2], look: 4, dots: true },
    ],
    ground: { x: [0, 1000], y: [9, 8] },
    foot: 'place',
    value: 'elevation',
    unitSystem: 'metric',
  });
  const [mark] = curves[1].marks;
  expect(curves[1].path).toBe('');
  expect(mark.up).toBeGreaterThanOrEqual(frame.top);
  expect(mark.down).toBeLessThanOrEqual(frame.bottom);
  expect(mark.up).toBeLessThan(mark.y);
  // Lower ground stands lower on the page, and there is room below it.
  expect(ground!.y[1]).toBeGreaterThan(ground!.y[0]);
  expect(ground!.y[1]).toBeLessThan(frame.bottom);
});

test('flows are drawn from zero, and curves that lie on each other have marks at other places', () => {
  const x = Array.from({ length: 100 }, (_, i) => i * 60);
  const y = x.map(() => 50);
  const { curves, frame } = curveSetModel(size, {
    curves: [
      { name: 'a', x, y, look: 0 },
      { name: 'b', x, y, look: 1 },
    ],
    foot: 'time',
    value: 'flow',
    unitSystem: 'metric',
  });
  expect(frame.y.domain()[0]).toBe(0);
  const [a, b] = curves.map(({ marks }) => marks.map((mark) => mark.x));
  expect(a.some((px) => b.includes(px))).toBe(false);
});
