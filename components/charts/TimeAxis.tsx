import { memo } from 'react';
import { ChartText, CHART_TEXT_SIZE } from './ChartText';
import type { Frame } from './geometry/frame';
import { textWidth } from './geometry/textWidth';
import type { TimeTicks } from './geometry/ticks';

interface Props {
  frame: Frame;
  ticks: TimeTicks;
}

/** Time from start along the foot of a drawing, its unit at the last value. */
export const TimeAxis = memo(function TimeAxis({ frame, ticks }: Props) {
  const { values, unit, unitSeconds } = ticks;
  return values.map((value, i) => {
    const number = String(value / unitSeconds);
    const label = i === values.length - 1 ? `${number} ${unit}` : number;
    const edge = frame.width - textWidth(label, CHART_TEXT_SIZE) / 2;
    return (
      <ChartText
        key={value}
        x={Math.min(frame.x(value), edge)}
        y={frame.bottom + 18}
        anchor="middle"
      >
        {label}
      </ChartText>
    );
  });
});
