import { memo, useCallback, useMemo } from 'react';
import { Circle, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { formatNumber, formatWithUnit } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { ChartBox, type ChartSize } from './ChartBox';
import { ChartText } from './ChartText';
import { valueAt } from './geometry/interpolate';
import { ratingModel, type RatingSeries } from './geometry/ratingModel';
import { tickDecimals } from './geometry/ticks';
import type { LiveTime } from './liveTime';
import { MovingCursor } from './MovingCursor';
import { ValueAxis } from './ValueAxis';

interface Props {
  label: string;
  series: RatingSeries;
  /** Time of the dot, s; null for none. */
  t: number | null;
  /** Moves the dot frame by frame; `t` then only names its values. */
  live?: LiveTime;
  unitSystem: UnitSystem;
  height?: number;
  initialWidth?: number;
}

/** Stage against flow: the loop that a flood draws at a place, rising whole and falling dashed, with the way it goes. */
export const RatingLoop = memo(function RatingLoop({ height = 220, ...props }: Props) {
  const unit = UNITS[props.unitSystem];
  return (
    <ChartBox
      label={sentence(props)}
      unit={`${unit.elevation.symbol} over ${unit.flow.symbol}`}
      height={height}
      initialWidth={props.initialWidth}
    >
      {(size) => <Drawing {...props} size={size} />}
    </ChartBox>
  );
});

function Drawing({ series, t, live, unitSystem, size }: Props & { size: ChartSize }) {
  const { colours } = useTheme();
  const { width, height } = size;
  const model = useMemo(
    () => ratingModel({ width, height }, series, unitSystem),
    [width, height, series, unitSystem],
  );
  const { frame, flowTicks } = model;
  const xAt = useCallback(
    (time: number) => model.xOf(valueAt(series.times, series.flow, time)),
    [model, series],
  );
  const yAt = useCallback(
    (time: number) => model.yOf(valueAt(series.times, series.stage, time)),
    [model, series],
  );
  const curve = { fill: 'none', stroke: colours.water, strokeWidth: 2 } as const;
  const decimals = tickDecimals(flowTicks);
  return (
    <>
      <ValueAxis frame={frame} ticks={model.stageTicks} />
      {flowTicks.map((tick) => (
        <ChartText key={tick} x={frame.x(tick)} y={frame.bottom + 18} anchor="middle">
          {formatNumber(tick, decimals)}
        </ChartText>
      ))}
      <ChartText x={frame.right} y={frame.bottom - 6} anchor="end">
        {`flow, ${UNITS[unitSystem].flow.symbol}`}
      </ChartText>
      <Path d={model.falling} {...curve} strokeDasharray="6 4" />
      <Path d={model.rising} {...curve} />
      {model.arrows.map(({ x, y, turn }) => (
        <Path
          key={`${x} ${y}`}
          d="M-5 -4L4 0L-5 4Z"
          fill={colours.water}
          transform={`translate(${x} ${y}) rotate(${turn})`}
        />
      ))}
      {t !== null && live && series.times.length ? (
        <MovingCursor live={live} xOf={xAt} yOf={yAt} />
      ) : null}
      {t !== null && !live && series.times.length ? (
        <Circle
          cx={model.xOf(valueAt(series.times, series.flow, t))}
          cy={model.yOf(valueAt(series.times, series.stage, t))}
          r={4}
          fill={colours.card}
          stroke={colours.ink}
          strokeWidth={1.5}
        />
      ) : null}
    </>
  );
}

function sentence({ label, series, t, unitSystem }: Props): string {
  if (t === null || !series.times.length) return label;
  const flow = formatWithUnit(valueAt(series.times, series.flow, t), 'flow', unitSystem);
  const stage = formatWithUnit(valueAt(series.times, series.stage, t), 'elevation', unitSystem);
  return `${label}; ${flow} at ${stage}`;
}
