import { Line } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { fromSi, type UnitSystem } from '@/shared/units/units';
import type { Frame } from './geometry/frame';

interface Props {
  levels: readonly { chainage: number; level: number }[];
  frame: Frame;
  unitSystem: UnitSystem;
}

const HALF_WIDTH = 7;

/** A short bar at each level that was named at a station; the table names them. */
export function LevelMarks({ levels, frame, unitSystem }: Props) {
  const { colours } = useTheme();
  return levels.map(({ chainage, level }, k) => {
    const x = frame.x(fromSi(chainage, 'chainage', unitSystem));
    const y = frame.y(fromSi(level, 'elevation', unitSystem));
    if (y < frame.top || y > frame.bottom) return null;
    return (
      <Line
        key={k}
        x1={x - HALF_WIDTH}
        x2={x + HALF_WIDTH}
        y1={y}
        y2={y}
        stroke={colours.ochre}
        strokeWidth={2.5}
      />
    );
  });
}
