import { memo } from 'react';
import { ChartText } from './ChartText';
import type { Frame } from './geometry/frame';
import type { TimeTicks } from './geometry/ticks';

interface Props {
  frame: Frame;
  ticks: TimeTicks;
}

/** Time from start along the foot of a drawing, its unit at the last value. */
export const TimeAxis = memo(function TimeAxis({ frame, ticks }: Props) {
  const { values, unit, unitSeconds } = ticks;
  return values.map((value, i) => (
    <ChartText key={value} x={frame.x(value)} y={frame.bottom + 18} anchor="middle">
      {i === values.length - 1 ? `${value / unitSeconds} ${unit}` : String(value / unitSeconds)}
    </ChartText>
  ));
});
