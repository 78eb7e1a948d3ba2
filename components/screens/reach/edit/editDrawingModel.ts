import { extentOf, makeFrame, roomyExtent, type Frame } from '@/components/charts/geometry/frame';
import { bandPath, linePath, project } from '@/components/charts/geometry/paths';
import { valueTicks } from '@/components/charts/geometry/ticks';
import type { Section } from '@/shared/surveys/types';
import { fromSi, toSi, type UnitSystem } from '@/shared/units/units';

/** Offsets between which the drawing shows the section, m. */
export type Window = readonly [number, number];
type Points = Section['points'];

export interface EditDrawingModel {
  frame: Frame;
  xTicks: number[];
  yTicks: number[];
  px: (offset: number) => number;
  py: (elevation: number) => number;
  /** The offset and elevation, m, of a place on the drawing, px. */
  at: (x: number, y: number) => [number, number];
}

/** Scales of the drawing: what lies within the window, with room for a hand above and below. */
export function editDrawingModel(
  size: { width: number; height: number },
  points: Points,
  window: Window,
  levels: readonly number[],
  system: UnitSystem,
): EditDrawingModel {
  const [low, high] = extentOf(groundWithin(points, window), levels) ?? [0, 1];
  const room = Math.max(0.5, 0.08 * (high - low));
  const unit = (m: number) => fromSi(m, 'elevation', system);
  const y = roomyExtent([unit(low - room), unit(high + room)], unit(1), 5);
  const x: [number, number] = [
    fromSi(window[0], 'length', system),
    fromSi(window[1] > window[0] ? window[1] : window[0] + 1, 'length', system),
  ];
  const frame = makeFrame(size, { top: 10, right: 14, bottom: 26, left: 46 }, x, y);
  return {
    frame,
    xTicks: valueTicks(x, frame.right - frame.left, 60),
    yTicks: valueTicks(y, frame.bottom - frame.top, 28),
    px: (m) => frame.x(fromSi(m, 'length', system)),
    py: (m) => frame.y(unit(m)),
    at: (left, top) => [
      toSi(frame.x.invert(left), 'length', system),
      toSi(frame.y.invert(top), 'elevation', system),
    ],
  };
}

/** The ground as a line, and as the earth below it. */
export function groundPaths(points: Points, { frame, px, py }: EditDrawingModel) {
  const xs = project(
    points.map(([y]) => y),
    px,
  );
  const ys = project(
    points.map(([, z]) => z),
    py,
  );
  return { line: linePath(xs, ys), fill: bandPath(xs, ys, frame.bottom) };
}

/** Elevations of the points within the window and of those that stand next outside. */
function groundWithin(points: Points, [from, to]: Window): number[] {
  return points
    .filter(([y], i) => {
      const before = points[i - 1]?.[0] ?? y;
      const after = points[i + 1]?.[0] ?? y;
      return Number.isFinite(y) && after >= from && before <= to;
    })
    .map(([, z]) => z)
    .filter(Number.isFinite);
}

/** The point nearest to a place of the drawing, px; null where none is within reach of a finger. */
export function pointNear(
  points: Points,
  { px, py }: Pick<EditDrawingModel, 'px' | 'py'>,
  [x, y]: readonly [number, number],
  reach: number,
): number | null {
  let [nearest, distance] = [-1, reach];
  points.forEach(([offset, elevation], i) => {
    const away = Math.hypot(px(offset) - x, py(elevation) - y);
    if (away < distance) [nearest, distance] = [i, away];
  });
  return nearest < 0 ? null : nearest;
}
