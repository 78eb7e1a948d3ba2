import { memo, useCallback, useMemo } from 'react';
import { Circle, Line, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { formatWithUnit } from '@/shared/units/format';
import { UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';
import { ChartBox, type ChartSize } from './ChartBox';
import { OBSERVED_LOOK } from './curveLooks';
import { CurveMark } from './CurveMark';
import { DragSurface } from './DragSurface';
import {
  hydrographModel,
  peakOf,
  type HydrographModel,
  type Series,
} from './geometry/hydrographModel';
import type { NamedLevel } from './geometry/levelLines';
import { nearestIndex, valueAt } from './geometry/interpolate';
import { overlap, type Polyline } from './geometry/placeLabel';
import { pinBox, pointPins, type Pin } from './geometry/pointPins';
import { shortTime } from './geometry/timeWords';
import type { LiveTime } from './liveTime';
import { MovingCursor } from './MovingCursor';
import { LevelLines, LevelNames } from './LevelLines';
import { PointPins, type RaisedPoint } from './PointPins';
import { PointPresses } from './PointPresses';
import { Reading, readingBox } from './Reading';
import { TimeAxis } from './TimeAxis';
import { ValueAxis } from './ValueAxis';

export interface HydrographProps {
  /** What is drawn, e.g. `Stage at Tornick bridge`. */
  label: string;
  quantity: Extract<Quantity, 'elevation' | 'depth' | 'flow' | 'velocity'>;
  /** SI. Keep the same object while only the cursor moves. */
  series: Series;
  /** A second curve to compare with, dashed; its name goes into the heading. */
  compare?: Series | null;
  /** Levels to hold a stage against, SI. Keep the same array while only the cursor moves. */
  levels?: readonly NamedLevel[];
  /** What was observed at the place, SI. Keep the same object while only the cursor moves. */
  observed?: Series | null;
  /** Points that were raised on moments of the place. */
  points?: readonly TimedPoint[];
  onPoint?: (id: number) => void;
  /** Highest value with its time where it is known better than from the series. */
  peak?: { value: number; time: number } | null;
  /** Time of the cursor, s; null for none. */
  t: number | null;
  /** Moves the cursor frame by frame; `t` then only names its value, a few times a second. */
  live?: LiveTime;
  /** Of ground or a dam, not of water. */
  isGround?: boolean;
  /** Left out: the drawing only shows. */
  onChange?: (t: number) => void;
  unitSystem: UnitSystem;
  height?: number;
  initialWidth?: number;
}

export interface TimedPoint extends RaisedPoint {
  /** s from start. */
  time: number;
}

/** A value against time, its peak named, its value at the cursor read out beside the curve and never over it. */
export const Hydrograph = memo(function Hydrograph(props: HydrographProps) {
  const { onChange, onPoint, points, height = 180, series } = props;
  const peak = props.peak === undefined ? peakOf(series) : props.peak;
  return (
    <ChartBox
      label={sentence(props, peak)}
      unit={UNITS[props.unitSystem][props.quantity].symbol}
      height={height}
      initialWidth={props.initialWidth}
      over={(size) =>
        onChange && series.times.length ? (
          <TimeDrag {...props} onChange={onChange} size={size} />
        ) : null
      }
      controls={
        onPoint && points?.length && series.times.length
          ? (size) => <Presses {...props} {...{ points, onPoint, size }} />
          : undefined
      }
    >
      {(size) => <Drawing {...props} peak={peak} size={size} />}
    </ChartBox>
  );
});

type Sized = HydrographProps & { size: ChartSize };

function useModel({ size, series, compare = null, quantity, unitSystem, ...more }: Sized) {
  const { width, height } = size;
  const { levels, observed } = more;
  return useMemo(
    () =>
      hydrographModel({ width, height }, series, compare, quantity, unitSystem, {
        levels,
        observed,
      }),
    [width, height, series, compare, quantity, unitSystem, levels, observed],
  );
}

/** Boxes of the points above the curve at their moments. */
function usePins({ series, points = NONE }: Sized, { frame, yOf, levels }: HydrographModel) {
  return useMemo(() => {
    const pinned = points.map(({ id, time }) => ({
      id,
      x: frame.x(time),
      y: yOf(valueAt(series.times, series.values, time)),
    }));
    return pointPins(
      pinned,
      frame,
      levels.flatMap(({ box }) => box ?? []),
    );
  }, [series, points, frame, yOf, levels]);
}

function Presses(props: Sized & Required<Pick<HydrographProps, 'points' | 'onPoint'>>) {
  const pins = usePins(props, useModel(props));
  return <PointPresses pins={pins} points={props.points} onPoint={props.onPoint} />;
}

/** Rests at the times that the series has values for. */
function TimeDrag(props: Sized & { onChange: (t: number) => void }) {
  const { x } = useModel(props).frame;
  const { times } = props.series;
  return (
    <DragSurface
      onDrag={(px) => props.onChange(times[nearestIndex(times, x.invert(px))])}
      style={props.size}
    />
  );
}

function Drawing(props: Sized) {
  const model = useModel(props);
  const pins = usePins(props, model);
  return (
    <>
      <ValueAxis frame={model.frame} ticks={model.valueTicks} />
      <TimeAxis frame={model.frame} ticks={model.timeTicks} />
      <LevelLines lines={model.levels} frame={model.frame} />
      <Curves model={model} isGround={props.isGround} />
      {model.observed ? <Observed at={model.observed} /> : null}
      <Marks {...props} model={model} pins={pins} />
      <LevelNames lines={model.levels} />
      <PointPins pins={pins} points={props.points ?? NONE} />
    </>
  );
}

interface CurvesProps {
  model: HydrographModel;
  isGround?: boolean;
}

const Curves = memo(function Curves({ model, isGround }: CurvesProps) {
  const { colours } = useTheme();
  return (
    <>
      {model.compare ? (
        <Path
          d={model.compare.path}
          fill="none"
          stroke={colours.soft}
          strokeWidth={1.25}
          strokeDasharray="5 4"
        />
      ) : null}
      <Path
        d={model.main.path}
        fill="none"
        stroke={isGround ? colours.earth : colours.water}
        strokeWidth={2}
        strokeLinejoin="round"
      />
    </>
  );
});

const Observed = memo(function Observed({ at: { x, y } }: { at: Polyline }) {
  return Array.from(x, (px, i) => <CurveMark key={i} x={px} y={y[i]} look={OBSERVED_LOOK} />);
});

/** The peak and the cursor with their readings. */
function Marks({
  series,
  peak,
  t,
  quantity,
  unitSystem,
  model,
  pins,
  live,
}: Sized & { model: HydrographModel; pins: readonly Pin[] }) {
  const { colours } = useTheme();
  const { frame, yOf } = model;
  const bounds = {
    x: frame.left,
    y: 0,
    width: frame.right - frame.left,
    height: frame.bottom,
  };
  const span = frame.x.domain()[1] - frame.x.domain()[0];
  const value = (si: number) => formatWithUnit(si, quantity, unitSystem);
  const at = useCallback(
    (time: number) => yOf(valueAt(series.times, series.values, time)),
    [yOf, series],
  );
  const cursor =
    t === null || !series.times.length
      ? null
      : { x: frame.x(t), y: yOf(valueAt(series.times, series.values, t)) };
  const soft = [
    ...(cursor ? [{ x: [cursor.x, cursor.x], y: [0, frame.bottom] }] : []),
    ...(model.compare ? [model.compare] : []),
    ...(model.observed ? [model.observed] : []),
  ];
  const lines = [model.main];

  const top = peak ? { x: frame.x(peak.time), y: yOf(peak.value) } : null;
  const peakText = peak
    ? [{ text: `${value(peak.value)} at ${shortTime(peak.time, span)}`, strong: true }]
    : [];
  // At the peak itself its own label says all.
  const apart = cursor && !(top && Math.hypot(top.x - cursor.x, top.y - cursor.y) < 6);
  const cursorText =
    t === null ? [] : [{ text: value(valueAt(series.times, series.values, t)), strong: false }];
  // The reading of the cursor goes first, close to its dot; the peak says its own time wherever it stands.
  const dots = [
    ...[top, cursor].flatMap((dot) => (dot ? [around(dot)] : [])),
    ...model.levels.flatMap(({ box }) => (box ? [box] : [])),
    ...pins.map(pinBox),
  ];
  const cursorBox =
    cursor && apart ? readingBox(cursorText, cursor, bounds, { lines, soft, taken: dots }) : null;
  const peakBox = top
    ? readingBox(peakText, top, bounds, {
        lines,
        soft,
        taken: cursorBox ? [...dots, cursorBox] : dots,
      })
    : null;
  return (
    <>
      {cursor && !live ? (
        <Line
          x1={cursor.x}
          x2={cursor.x}
          y1={4}
          y2={frame.bottom}
          stroke={colours.ink}
          strokeWidth={1.25}
        />
      ) : null}
      {top && peakBox ? (
        <>
          <Circle cx={top.x} cy={top.y} r={4} fill={colours.water} />
          <Reading texts={peakText} box={peakBox} from={top.x} />
        </>
      ) : null}
      {cursor && live ? (
        <MovingCursor live={live} xOf={frame.x} yOf={at} line={{ top: 4, bottom: frame.bottom }} />
      ) : null}
      {cursor && !live ? (
        <Circle
          cx={cursor.x}
          cy={cursor.y}
          r={3.5}
          fill={colours.card}
          stroke={colours.ink}
          strokeWidth={1.5}
        />
      ) : null}
      {cursor && cursorBox && !(peakBox && overlap(cursorBox, peakBox)) ? (
        <Reading texts={cursorText} box={cursorBox} from={cursor.x} />
      ) : null}
    </>
  );
}

/** The box of a dot. */
const around = ({ x, y }: { x: number; y: number }) => ({
  x: x - 5,
  y: y - 5,
  width: 10,
  height: 10,
});

function sentence(props: HydrographProps, peak: HydrographProps['peak']): string {
  const { label, series, observed, quantity, unitSystem, t } = props;
  const n = series.times.length;
  if (!n) return `${label}: no values`;
  const span = series.times[n - 1] - series.times[0];
  const value = (si: number) => formatWithUnit(si, quantity, unitSystem);
  const parts = [label];
  if (peak) parts.push(`highest ${value(peak.value)} at ${shortTime(peak.time, span)}`);
  if (t !== null)
    parts.push(`${value(valueAt(series.times, series.values, t))} at ${shortTime(t, span)}`);
  const seen = observed && peakOf(observed);
  if (seen) parts.push(`observed at most ${value(seen.value)} at ${shortTime(seen.time, span)}`);
  return parts.join('; ');
}

const NONE: never[] = [];
