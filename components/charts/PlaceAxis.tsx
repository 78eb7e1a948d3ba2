import { memo } from 'react';
import { formatNumber } from '@/shared/units/format';
import { ChartText } from './ChartText';
import type { Frame } from './geometry/frame';
import { tickDecimals } from './geometry/ticks';

interface Props {
  frame: Frame;
  ticks: readonly number[];
}

/** Values along the foot of a drawing. */
export const PlaceAxis = memo(function PlaceAxis({ frame, ticks }: Props) {
  const decimals = tickDecimals(ticks);
  return ticks.map((tick) => (
    <ChartText key={tick} x={frame.x(tick)} y={frame.bottom + 18} anchor="middle">
      {formatNumber(tick, decimals)}
    </ChartText>
  ));
});
