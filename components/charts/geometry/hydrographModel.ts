import { type } from '@/components/theme/tokens';
import { fromSi, type Quantity, type UnitSystem } from '@/shared/units/units';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { levelLines, levelsNear, type LevelLine, type NamedLevel } from './levelLines';
import { linePath, project } from './paths';
import type { Polyline } from './placeLabel';
import { thinSeries } from './thinSeries';
import { timeTicks, valueTicks, type TimeTicks } from './ticks';

/** Values against time, SI, rising times in s. */
export interface Series {
  times: ArrayLike<number>;
  values: ArrayLike<number>;
}

export interface Curve extends Polyline {
  path: string;
}

export interface HydrographModel {
  frame: Frame;
  timeTicks: TimeTicks;
  valueTicks: number[];
  main: Curve;
  compare: Curve | null;
  /** What was observed within the time that is drawn: points without a line between them. */
  observed: Polyline | null;
  levels: LevelLine[];
  /** px of an SI value. */
  yOf: (value: number) => number;
}

/** Least height of a drawing in SI, so that a steady value is drawn level. */
const LEAST: Partial<Record<Quantity, number>> = { elevation: 0.2, depth: 0.2, velocity: 0.2 };

/** All of a hydrograph that does not follow the cursor. Flows and velocities are drawn from zero. */
export function hydrographModel(
  size: { width: number; height: number },
  series: Series,
  compare: Series | null,
  quantity: Quantity,
  unitSystem: UnitSystem,
  {
    levels = [],
    observed = null,
  }: { levels?: readonly NamedLevel[]; observed?: Series | null } = {},
): HydrographModel {
  const unit = (value: number) => fromSi(value, quantity, unitSystem);
  const x = extentOf(series.times) ?? [0, 1];
  const seen = observed && within(observed, x);
  const rows = [
    series.values,
    ...(compare ? [compare.values] : []),
    ...(seen ? [seen.values] : []),
  ];
  const zero = quantity === 'elevation' ? [] : [[0]];
  const drawn: [number, number] = extentOf(...rows, ...zero) ?? [0, 1];
  const near = levelsNear(levels, ...drawn, LEAST[quantity] ?? 1);
  const [low, high] = extentOf(
    drawn,
    near.map(({ level }) => level),
  )!;
  const y = roomyExtent([unit(low), unit(high)], unit(LEAST[quantity] ?? 1), 4);
  const frame = makeFrame(size, MARGINS, x, y);
  const yOf = (value: number) => frame.y(unit(value));
  const curve = ({ times, values }: Series): Curve => {
    const thin = thinSeries(times, values, Math.max(50, Math.round(size.width / 2)));
    const points = { x: project(thin.x, frame.x), y: project(thin.y, yOf) };
    return { ...points, path: linePath(points.x, points.y) };
  };
  return {
    frame,
    timeTicks: timeTicks(x, frame.right - frame.left, 60),
    valueTicks: valueTicks(y, frame.bottom - frame.top, 26),
    main: curve(series),
    compare: compare ? curve(within(compare, x)) : null,
    observed: seen && { x: project(seen.times, frame.x), y: project(seen.values, yOf) },
    levels: levelLines(near, yOf, frame.left, type.caption.fontSize),
    yOf,
  };
}

/** Above the plot there is room for the name of the peak. */
const MARGINS = { top: 24, right: 14, bottom: 26, left: 46 };

/** The part of a series that lies in the drawing. */
function within({ times, values }: Series, [from, to]: readonly [number, number]): Series {
  const kept: { times: number[]; values: number[] } = { times: [], values: [] };
  for (let i = 0; i < times.length; i++) {
    if (times[i] < from || times[i] > to) continue;
    kept.times.push(times[i]);
    kept.values.push(values[i]);
  }
  return kept;
}

/** The highest value and the first time it is reached; null of an empty series. */
export function peakOf({ times, values }: Series): { value: number; time: number } | null {
  let at = -1;
  for (let i = 0; i < values.length; i++) if (at < 0 || values[i] > values[at]) at = i;
  return at < 0 ? null : { value: values[at], time: times[at] };
}
