import type { CaseCurves } from '@/shared/verificationCases/types';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { bandPath, linePath, project } from './paths';
import { timeTicks, valueTicks, type TimeTicks } from './ticks';

export type ComparedQuantity = 'stage' | 'flow';

export interface ComparisonModel {
  frame: Frame;
  xTicks: number[];
  /** null along the chainage. */
  time: TimeTicks | null;
  yTicks: number[];
  /** Ground up to the bed; empty where there is none in the drawing. */
  ground: string;
  groundLine: string;
  /** Water between bed and exact surface; of the stage along the chainage only. */
  water: string;
  exact: string;
  /** Computed values, thinned so that one dot is told from the next. */
  dots: { x: number; y: number }[];
  /** Stretches that the norms leave out, px. */
  leftOut: [number, number][];
}

/** px between two dots. */
const DOT_EVERY = 9;
/** A line between two dots that leaps by more px than this shows the dots between. */
const LEAP = 6;
/** Least height of a drawing, so that rounding is not drawn as a wave: a share of the largest value. */
const LEAST_SHARE = 0.02;
const MARGINS = { top: 26, right: 14, bottom: 28, left: 52 };

/** Computed over exact: a line and dots, told apart by their shape. SI. Pure; for the screen and for print. */
export function comparisonModel(
  size: { width: number; height: number },
  curves: CaseCurves,
  quantity: ComparedQuantity,
): ComparisonModel {
  const { along, at, bed } = curves;
  const { computed, exact } = curves[quantity];
  const showsGround = quantity === 'stage' && bed !== null;
  const rows = [computed, exact, ...(quantity === 'flow' ? [[0]] : showsGround ? [bed] : [])];
  const extent = extentOf(...rows) ?? [0, 1];
  const largest = Math.max(Math.abs(extent[0]), Math.abs(extent[1])) || 1;
  const low = showsGround ? extent[0] - 0.08 * (extent[1] - extent[0]) : extent[0];
  const y = roomyExtent([low, extent[1]], LEAST_SHARE * largest, 5);
  const x = extentOf(at) ?? [0, 1];
  const frame = makeFrame(size, MARGINS, x, y);
  const xs = project(at, frame.x);
  const computedY = project(computed, frame.y);
  const exactY = project(exact, frame.y);
  const bedY = showsGround ? project(bed, frame.y) : null;
  const width = frame.right - frame.left;
  const time = along === 'time' ? timeTicks(x, width, 64) : null;
  return {
    frame,
    xTicks: time?.values ?? valueTicks(x, width, 72),
    time,
    yTicks: valueTicks(y, frame.bottom - frame.top, 34),
    ground: bedY ? bandPath(xs, bedY, frame.bottom) : '',
    groundLine: bedY ? linePath(xs, bedY) : '',
    water: bedY ? bandPath(xs, exactY, bedY) : '',
    exact: linePath(xs, exactY),
    dots: distinct(xs, computedY),
    leftOut: curves.leftOut.map(([from, to]) => [
      Math.max(frame.left, frame.x(from)),
      Math.min(frame.right, frame.x(to)),
    ]),
  };
}

function distinct(xs: Float64Array, ys: Float64Array): { x: number; y: number }[] {
  const dots: { x: number; y: number }[] = [];
  let last = { x: -Infinity, y: 0 };
  for (let i = 0; i < xs.length; i++) {
    const dot = { x: xs[i], y: ys[i] };
    const far = dot.x - last.x >= DOT_EVERY;
    const leaps = dot.x - last.x >= 1 && Math.abs(dot.y - last.y) >= LEAP;
    if (!far && !leaps) continue;
    dots.push(dot);
    last = dot;
  }
  return dots;
}
