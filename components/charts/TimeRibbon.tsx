import { memo, useCallback, useId, useMemo, useRef } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { ClipPath, Defs, Path } from 'react-native-svg';
import { scaleLinear } from 'd3-scale';
import { useTheme } from '@/components/theme/useTheme';
import { ChartText } from './ChartText';
import { extentOf } from './geometry/frame';
import { nearestIndex, valueAt } from './geometry/interpolate';
import { bandPath, linePath, project } from './geometry/paths';
import { thinSeries } from './geometry/thinSeries';
import { timeTicks } from './geometry/ticks';
import { timeWords } from './geometry/timeWords';
import type { LiveTime } from './liveTime';
import { SliderSurface } from './SliderSurface';
import { useEachFrame } from './useEachFrame';
import { useWidth } from './useWidth';

interface Shape {
  /** Inflow of the run, s and m³/s; empty where the upstream end is not an inflow. */
  inflow: { times: readonly number[]; flows: readonly number[] };
  /** s. */
  start?: number;
  end: number;
  initialWidth?: number;
}

export interface TimeRibbonProps extends Shape {
  /** Moves the hand frame by frame. */
  live: LiveTime;
  /** Chosen time in words and for the keys, s. */
  t: number;
  onChange: (t: number) => void;
  /** s that an arrow key moves. */
  step: number;
  /** Clock time of t = 0. */
  startsAt: string | null;
}

const HEIGHT = 76;
const PLOT_TOP = 10;
const PLOT_BOTTOM = 56;
const INSET = 8;

/** The inflow hydrograph is the slider: drag along the flood to move in time. */
export function TimeRibbon({ live, t, onChange, step, startsAt, ...shape }: TimeRibbonProps) {
  const { start = 0, end } = shape;
  const { width, measured } = useWidth(shape.initialWidth);
  const stops = useMemo(() => timeStops(start, end, step), [start, end, step]);
  const x = timeScale(start, end, width);
  return (
    <View {...measured} style={styles.box}>
      <SliderSurface
        label="Time"
        stops={stops}
        page={Math.max(1, Math.round(stops.length / 10))}
        value={t}
        valueText={timeWords(t, end - start, startsAt)}
        onChange={onChange}
        onDrag={(px) => onChange(stops[nearestIndex(stops, x.invert(px))])}
      >
        <Flood {...shape} width={width} live={live} knob />
      </SliderSurface>
    </View>
  );
}

export interface TimeProgressProps extends Shape {
  /** Simulated time that is reached, s. */
  reached: number;
  /** 0..1. */
  progress: number;
  valueText: string;
}

/** The same flood filling while it computes. */
export function TimeProgress({ reached, progress, valueText, ...shape }: TimeProgressProps) {
  const { width, measured } = useWidth(shape.initialWidth);
  const live = useMemo(
    () => ({ time: () => reached, subscribe: () => () => undefined }),
    [reached],
  );
  return (
    <View
      {...measured}
      style={styles.box}
      role="progressbar"
      aria-label="Progress of the run"
      aria-valuemin={0}
      aria-valuemax={100}
      aria-valuenow={Math.round(progress * 100)}
      aria-valuetext={valueText}
    >
      <Flood {...shape} width={width} live={live} />
    </View>
  );
}

interface FloodProps extends Shape {
  width: number;
  live: LiveTime;
  knob?: boolean;
}

/** What moves is written by ref, frame by frame. */
const Flood = memo(function Flood({ inflow, start = 0, end, width, live, knob }: FloodProps) {
  const { colours } = useTheme();
  const passed = useId();
  const drawn = useMemo(() => floodShape(inflow, start, end, width), [inflow, start, end, width]);
  const reached = useRef<SVGRectElement>(null);
  const hand = useRef<SVGGElement>(null);
  const dot = useRef<SVGCircleElement>(null);
  const draw = useCallback(
    (t: number) => {
      const px = timeScale(start, end, width)(t);
      reached.current?.setAttribute('width', Math.max(0, px).toFixed(1));
      hand.current?.setAttribute('transform', `translate(${px.toFixed(1)} 0)`);
      dot.current?.setAttribute('cy', drawn.yAt(t).toFixed(1));
    },
    [start, end, width, drawn],
  );
  useEachFrame(live, draw);
  if (width <= 0) return <View style={styles.box} />;
  return (
    <Svg width={width} height={HEIGHT}>
      <Defs>
        <ClipPath id={passed}>
          <rect ref={reached} x={0} y={0} height={HEIGHT} />
        </ClipPath>
      </Defs>
      <Path d={drawn.band} fill={colours.line} />
      <Path d={drawn.band} fill={colours.waterTint} clipPath={`url(#${passed})`} />
      <Path
        d={drawn.line}
        fill="none"
        stroke={colours.water}
        strokeWidth={2}
        clipPath={`url(#${passed})`}
      />
      <RibbonAxis start={start} end={end} width={width} />
      <g ref={hand}>
        <line y1={2} y2={PLOT_BOTTOM + 2} stroke={colours.ink} strokeWidth={2} />
        {knob ? <circle ref={dot} r={6.5} fill={colours.ink} /> : null}
      </g>
    </Svg>
  );
});

const RibbonAxis = memo(function RibbonAxis(props: { start: number; end: number; width: number }) {
  const { start, end, width } = props;
  const x = timeScale(start, end, width);
  const { values, unit, unitSeconds } = timeTicks([start, end], width, 76);
  return values.map((value) => (
    <ChartText key={value} x={x(value)} y={HEIGHT - 4} anchor={anchorOf(x(value), width)}>
      {`${value / unitSeconds} ${unit}`}
    </ChartText>
  ));
});

function anchorOf(px: number, width: number) {
  if (px < 24) return 'start';
  return px > width - 24 ? 'end' : 'middle';
}

const timeScale = (start: number, end: number, width: number) =>
  scaleLinear([start, end], [INSET, Math.max(INSET + 1, width - INSET)]);

function timeStops(start: number, end: number, step: number): number[] {
  const count = Math.max(1, Math.min(20_000, Math.ceil((end - start) / step - 1e-9)));
  return Array.from({ length: count + 1 }, (_, i) => Math.min(end, start + i * step));
}

/** Without an inflow the ribbon is a level band. */
function floodShape(inflow: Shape['inflow'], start: number, end: number, width: number) {
  const x = timeScale(start, end, width);
  const flowing = inflow.times.length > 0;
  const times = flowing ? [start, ...inside(inflow.times, start, end), end] : [start, end];
  const flows = times.map((time) => (flowing ? valueAt(inflow.times, inflow.flows, time) : 1));
  const thin = thinSeries(times, flows, Math.max(50, Math.round(width / 2)));
  const high = Math.max(extentOf(flows)?.[1] ?? 0, 1e-9);
  const y = scaleLinear([0, high], [PLOT_BOTTOM, flowing ? PLOT_TOP : PLOT_BOTTOM - 14]).clamp(
    true,
  );
  const xs = project(thin.x, x);
  const ys = project(thin.y, y);
  return {
    band: bandPath(xs, ys, PLOT_BOTTOM),
    line: linePath(xs, ys),
    yAt: (time: number) => y(valueAt(times, flows, time)),
  };
}

const inside = (times: readonly number[], start: number, end: number) =>
  times.filter((time) => time > start && time < end);

const styles = StyleSheet.create({
  box: { alignSelf: 'stretch', height: HEIGHT },
});
