import { memo } from 'react';
import { Circle, Line } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { fromSi, type UnitSystem } from '@/shared/units/units';
import { ChartText } from './ChartText';
import type { Frame } from './geometry/frame';
import { valueAt } from './geometry/interpolate';
import type { LongProfile } from './geometry/longProfile';
import type { StationName } from './geometry/stationNames';

interface Props {
  sections: readonly { id: string; chainage: number }[];
  stations: readonly { name: string; chainage: number }[];
  names: readonly StationName[];
  profile: LongProfile;
  frame: Frame;
  unitSystem: UnitSystem;
}

/** A tick a surveyed section at the foot, a ring a station on the bed, its name in the ground where there is room. */
export const StationMarks = memo(function StationMarks(props: Props) {
  const { sections, stations, names, profile, frame, unitSystem } = props;
  const { colours } = useTheme();
  const px = (chainage: number) => frame.x(fromSi(chainage, 'chainage', unitSystem));
  const bedAt = (chainage: number) =>
    frame.y(fromSi(valueAt(profile.chainages, profile.bed, chainage), 'elevation', unitSystem));
  return (
    <>
      {sections.map(({ id, chainage }) => (
        <Line
          key={id}
          x1={px(chainage)}
          x2={px(chainage)}
          y1={frame.bottom}
          y2={frame.bottom + 4}
          stroke={colours.soft}
          strokeWidth={1}
        />
      ))}
      {stations.map(({ name, chainage }) => (
        <Circle
          key={`${name} ${chainage}`}
          cx={px(chainage)}
          cy={bedAt(chainage)}
          r={3.5}
          fill={colours.card}
          stroke={colours.earth}
          strokeWidth={1.5}
        />
      ))}
      {names.map(({ name, box }) => (
        <ChartText key={name} x={box.x} y={box.y + 12} tone="earth">
          {name}
        </ChartText>
      ))}
    </>
  );
});
