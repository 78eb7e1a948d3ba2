import { fromSi, UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { bandPath, linePath, project } from './paths';
import type { Polyline } from './placeLabel';
import { timeTicks, valueTicks, type TimeTicks } from './ticks';

/** Curves over times (s) or chainages (m), SI; rows of one length. */
export interface BandData {
  x: readonly number[];
  line: readonly number[];
  band: { low: readonly number[]; high: readonly number[] } | null;
  /** Dashed beside it. */
  compare?: readonly number[] | null;
  /** Ground below. */
  ground?: readonly number[] | null;
  /** A level that matters. */
  level?: number | null;
}
export type BandAxis = 'time' | 'chainage';

export interface BandModel {
  frame: Frame;
  valueTicks: number[];
  /** Of a time axis. */
  timeTicks: TimeTicks | null;
  /** Of a chainage axis. */
  placeTicks: number[];
  xOf: (x: number) => number;
  yOf: (value: number) => number;
  /** SI of a px. */
  invert: (px: number) => number;
  line: Polyline & { path: string };
  band: string | null;
  edges: Polyline[];
  compare: (Polyline & { path: string }) | null;
  ground: { fill: string; edge: string } | null;
}

const MARGINS = { top: 24, right: 14, bottom: 26, left: 52 };
/** Least height of a drawing in SI, so that nothing is made of noise. */
const LEAST: Partial<Record<Quantity, number>> = { elevation: 0.2, depth: 0.01 };

/** All of a drawing with a band that does not follow the cursor. */
export function bandModel(
  size: { width: number; height: number },
  data: BandData,
  axis: BandAxis,
  quantity: Extract<Quantity, 'elevation' | 'depth' | 'flow'>,
  system: UnitSystem,
): BandModel {
  const unit = (value: number) => fromSi(value, quantity, system);
  const { x, line, band, compare, ground, level } = data;
  const rows = [line, band?.low, band?.high, compare, ground, level == null ? null : [level]];
  const zero = quantity === 'elevation' ? [] : [[0]];
  const [low, high] = extentOf(...rows.filter((row) => row != null), ...zero) ?? [0, 1];
  const foot = ground ? low - 0.08 * (high - low) : low;
  const y = roomyExtent([unit(foot), unit(high)], unit(LEAST[quantity] ?? 1), 4);
  const along = axis === 'time' ? (value: number) => value : toChainage(system);
  const [from, to] = extentOf(x) ?? [0, 1];
  const xExtent: [number, number] = [along(from), along(to)];
  const frame = makeFrame(size, MARGINS, xExtent, y);
  const xOf = (value: number) => frame.x(along(value));
  const yOf = (value: number) => frame.y(unit(value));
  const px = project(x, xOf);
  const curve = (row: readonly number[]) => {
    const rowPx = project(row, yOf);
    return { x: px, y: rowPx, path: linePath(px, rowPx) };
  };
  const [lower, upper] = band ? [project(band.low, yOf), project(band.high, yOf)] : [];
  const bed = ground ? project(ground, yOf) : null;
  const width = frame.right - frame.left;
  return {
    frame,
    valueTicks: valueTicks(y, frame.bottom - frame.top, 28),
    timeTicks: axis === 'time' ? timeTicks(xExtent, width, 60) : null,
    placeTicks: axis === 'chainage' ? valueTicks(xExtent, width, 72) : [],
    xOf,
    yOf,
    invert: (at) =>
      axis === 'time' ? frame.x.invert(at) : frame.x.invert(at) * UNITS[system].chainage.si,
    line: curve(line),
    band: upper && lower ? bandPath(px, upper, lower) : null,
    edges: [upper, lower].flatMap((row) => (row ? [{ x: px, y: row }] : [])),
    compare: compare ? curve(compare) : null,
    ground: bed && { fill: bandPath(px, bed, frame.bottom), edge: linePath(px, bed) },
  };
}

const toChainage = (system: UnitSystem) => (value: number) => fromSi(value, 'chainage', system);
