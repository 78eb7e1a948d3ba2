import { Pressable, StyleSheet } from 'react-native';
import type { Pin } from './geometry/pointPins';
import type { RaisedPoint } from './PointPins';

interface Props {
  pins: readonly Pin[];
  points: readonly RaisedPoint[];
  onPoint: (id: number) => void;
}

/** What is pressed of the numbers of raised points, laid over their drawing: each leads to its point. */
export function PointPresses({ pins, points, onPoint }: Props) {
  return pins.map(({ id, x, y }) => (
    <Pressable
      key={id}
      role="button"
      aria-label={points.find((point) => point.id === id)!.words}
      style={[styles.press, { left: x - PRESS / 2, top: y - PRESS / 2 }]}
      onPress={() => onPoint(id)}
    />
  ));
}

/** px: the least that a finger hits by WCAG 2.2. */
const PRESS = 24;

const styles = StyleSheet.create({
  press: { position: 'absolute', width: PRESS, height: PRESS },
});
