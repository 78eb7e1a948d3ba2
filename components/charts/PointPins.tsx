import { G, Line, Rect } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { ChartText } from './ChartText';
import { PIN, type Pin } from './geometry/pointPins';

/** A point that was raised on what is drawn. */
export interface RaisedPoint {
  id: number;
  /** As it is called where the points are discussed. */
  number: number;
  isClosed: boolean;
  /** All of it in a sentence. */
  words: string;
}

interface Props {
  pins: readonly Pin[];
  points: readonly RaisedPoint[];
}

/** Numbers in boxes with a stem to what they speak of: full while they wait, an outline once they are closed. */
export function PointPins({ pins, points }: Props) {
  const { colours } = useTheme();
  const stems = pins.map(({ id, x, y, footX, footY }) => (
    <Line key={id} x1={x} y1={y} x2={footX} y2={footY} stroke={colours.ink} strokeWidth={1} />
  ));
  // Over all stems, so that none runs through a number.
  const boxes = pins.map(({ id, x, y }) => {
    const { number, isClosed } = points.find((point) => point.id === id)!;
    return (
      <G key={id}>
        <Rect
          x={x - PIN / 2}
          y={y - PIN / 2}
          width={PIN}
          height={PIN}
          rx={3}
          fill={isClosed ? colours.card : colours.ink}
          stroke={colours.ink}
          strokeWidth={1.5}
        />
        <ChartText x={x} y={y + 4.5} anchor="middle" tone={isClosed ? 'ink' : 'card'} strong>
          {String(number)}
        </ChartText>
      </G>
    );
  });
  return (
    <>
      {stems}
      {boxes}
    </>
  );
}
