import { memo } from 'react';
import { Line } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { formatNumber } from '@/shared/units/format';
import { ChartText } from './ChartText';
import type { Frame } from './geometry/frame';
import { tickDecimals } from './geometry/ticks';

interface Props {
  frame: Frame;
  ticks: readonly number[];
}

/** Horizontal hairlines with their values at the left; the unit stands in the heading. */
export const ValueAxis = memo(function ValueAxis({ frame, ticks }: Props) {
  const { colours } = useTheme();
  const decimals = tickDecimals(ticks);
  return ticks.map((tick) => {
    const y = frame.y(tick);
    return [
      <Line
        key={`line ${tick}`}
        x1={frame.left}
        x2={frame.right}
        y1={y}
        y2={y}
        stroke={colours.line}
        strokeWidth={1}
      />,
      <ChartText key={tick} x={frame.left - 8} y={y + 4} anchor="end">
        {formatNumber(tick, decimals)}
      </ChartText>,
    ];
  });
});
