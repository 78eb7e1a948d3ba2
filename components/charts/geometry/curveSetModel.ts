import { fromSi, type Quantity, type UnitSystem } from '@/shared/units/units';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { linePath, project } from './paths';
import { thinSeries } from './thinSeries';
import { timeTicks, valueTicks, type TimeTicks } from './ticks';

/** One line or row of points of a drawing with several; SI. */
export interface SetCurve {
  name: string;
  x: ArrayLike<number>;
  y: ArrayLike<number>;
  /** Which of the looks it has: colour, dash and mark together. */
  look: number;
  /** Points without a line between them: what was observed. */
  dots?: boolean;
  /** Half the length of a bar above and below each point, one a point. */
  reach?: ArrayLike<number>;
}

/** What stands along the foot: time in s, place in m, or a plain number. */
export type FootKind = 'time' | 'place' | 'number';
/** What is read at the left. */
export type ValueKind = Extract<Quantity, 'elevation' | 'depth' | 'flow'> | 'number';

export interface DrawnCurve {
  curve: SetCurve;
  /** px; thinned for the width where it is a line. */
  x: Float64Array;
  y: Float64Array;
  path: string;
  /** Where the marks stand that tell it from the others, px. */
  marks: { x: number; y: number; up: number; down: number }[];
}

export interface CurveSetModel {
  frame: Frame;
  timeTicks: TimeTicks | null;
  footTicks: number[];
  valueTicks: number[];
  curves: DrawnCurve[];
  /** Ground under the water, px. */
  ground: { x: Float64Array; y: Float64Array } | null;
  /** px of an SI value along the foot. */
  footOf: (value: number) => number;
}

export interface CurveSetInput {
  curves: readonly SetCurve[];
  ground?: { x: ArrayLike<number>; y: ArrayLike<number> } | null;
  foot: FootKind;
  value: ValueKind;
  unitSystem: UnitSystem;
}

const LEAST: Record<ValueKind, number> = { elevation: 0.5, depth: 0.2, flow: 1, number: 0.01 };
const MARGINS = { top: 26, right: 16, bottom: 28, left: 50 };
/** Ground below the lowest bed, as a share of the height. */
const FOOT = 0.12;
/** Marks along a line. */
const MARKS = 7;

/** Several curves on one pair of scales; flows and plain numbers are drawn from zero. */
export function curveSetModel(
  size: { width: number; height: number },
  { curves, ground, foot, value, unitSystem }: CurveSetInput,
): CurveSetModel {
  const inUnit = (v: number) => (value === 'number' ? v : fromSi(v, value, unitSystem));
  const along = (v: number) => (foot === 'place' ? fromSi(v, 'chainage', unitSystem) : v);
  const fromZero = value === 'flow' || value === 'number';
  const bars = curves.flatMap(({ y, reach }) =>
    reach ? [Array.from(y, (v, i) => v - reach[i]), Array.from(y, (v, i) => v + reach[i])] : [],
  );
  const rows = [...curves.map(({ y }) => y), ...bars, ...(ground ? [ground.y] : [])];
  const [low, high] = extentOf(...rows, ...(fromZero ? [[0]] : [])) ?? [0, 1];
  // Room below the ground for the name of the axis.
  const lowest = ground ? low - FOOT * (high - low) : low;
  const y = roomyExtent([inUnit(lowest), inUnit(high)], inUnit(LEAST[value]), 5);
  const lines = [...curves.map((curve) => curve.x), ...(ground ? [ground.x] : [])];
  const [from, to] = extentOf(...lines) ?? [0, 1];
  const x: [number, number] =
    to > from ? [along(from), along(to)] : [along(from) - 1, along(to) + 1];
  const frame = makeFrame(size, MARGINS, x, y);
  const footOf = (v: number) => frame.x(along(v));
  const valueOf = (v: number) => frame.y(inUnit(v));
  return {
    frame,
    timeTicks: foot === 'time' ? timeTicks(x, frame.right - frame.left, 60) : null,
    footTicks: foot === 'time' ? [] : valueTicks(x, frame.right - frame.left, 64),
    valueTicks: valueTicks(y, frame.bottom - frame.top, 40),
    curves: curves.map((curve, k) => drawn(curve, k, size.width, footOf, valueOf)),
    ground: ground ? { x: project(ground.x, footOf), y: project(ground.y, valueOf) } : null,
    footOf,
  };
}

function drawn(
  curve: SetCurve,
  order: number,
  width: number,
  footOf: (v: number) => number,
  valueOf: (v: number) => number,
): DrawnCurve {
  const { dots, reach } = curve;
  const { x, y } = dots ? curve : thinSeries(curve.x, curve.y, Math.max(50, Math.round(width / 2)));
  const [px, py] = [project(x, footOf), project(y, valueOf)];
  const marks = [];
  const step = dots ? 1 : Math.max(1, Math.floor(x.length / MARKS));
  // Each curve begins its marks elsewhere, so that two that lie on each other both show.
  const first = dots ? 0 : Math.floor((step * ((order % 4) + 0.5)) / 4);
  for (let i = first; i < x.length; i += step) {
    const bar = reach?.[i] ?? 0;
    if (Number.isFinite(py[i]))
      marks.push({ x: px[i], y: py[i], up: valueOf(y[i] + bar), down: valueOf(y[i] - bar) });
  }
  return { curve, x: px, y: py, path: dots ? '' : linePath(px, py), marks };
}
