import { G, Line } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { fromSi, type UnitSystem } from '@/shared/units/units';
import { OBSERVED_LOOK } from './curveLooks';
import { CurveMark } from './CurveMark';
import type { Frame } from './geometry/frame';
import type { ObservedLevel } from './geometry/longProfile';

interface Props {
  observed: readonly ObservedLevel[];
  frame: Frame;
  unitSystem: UnitSystem;
}

/** Levels that a flood was seen at, each with a bar of what it is allowed. Those off the drawn reach are left out. */
export function ObservedMarks({ observed, frame, unitSystem }: Props) {
  const { colours } = useTheme();
  return observed.map(({ chainage, level, tolerance }, k) => {
    const x = frame.x(fromSi(chainage, 'chainage', unitSystem));
    if (x < frame.left || x > frame.right) return null;
    const y = (m: number) => frame.y(fromSi(m, 'elevation', unitSystem));
    return (
      <G key={k}>
        <Line
          x1={x}
          x2={x}
          y1={y(level + tolerance)}
          y2={y(level - tolerance)}
          stroke={colours.ink}
          strokeWidth={1}
        />
        <CurveMark x={x} y={y(level)} look={OBSERVED_LOOK} />
      </G>
    );
  });
}
