import { memo } from 'react';
import { Circle, Line } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { fromSi, type UnitSystem } from '@/shared/units/units';
import { ChartText, CHART_TEXT_SIZE } from './ChartText';
import type { Frame } from './geometry/frame';
import { valueAt } from './geometry/interpolate';
import type { LongProfile } from './geometry/longProfile';
import type { Box } from './geometry/placeLabel';
import { textWidth } from './geometry/textWidth';

interface Props {
  sections: readonly { id: string; chainage: number }[];
  stations: readonly { name: string; chainage: number }[];
  profile: LongProfile;
  frame: Frame;
  unitSystem: UnitSystem;
}

/** A tick a surveyed section at the foot, a ring a station on the bed, its name in the ground where there is room. */
export const StationMarks = memo(function StationMarks(props: Props) {
  const { sections, stations, profile, frame, unitSystem } = props;
  const { colours } = useTheme();
  const px = (chainage: number) => frame.x(fromSi(chainage, 'chainage', unitSystem));
  const bedAt = (chainage: number) =>
    frame.y(fromSi(valueAt(profile.chainages, profile.bed, chainage), 'elevation', unitSystem));
  const names = namesWithRoom(stations, px, bedAt, frame);
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

const HEIGHT = 16;

/** Names that find a place in the ground left below their ring, clear of one another, the foot and the cursor. */
function namesWithRoom(
  stations: Props['stations'],
  px: (chainage: number) => number,
  bedAt: (chainage: number) => number,
  frame: Frame,
) {
  const placed: { name: string; box: Box }[] = [];
  for (const { name, chainage } of stations) {
    const width = textWidth(name, CHART_TEXT_SIZE);
    const x = px(chainage) - width - 8;
    const top = bedAt(chainage) + 8;
    const box = { x, y: top, width, height: HEIGHT };
    const hitsEdge = x < frame.left + 4 || top + HEIGHT > frame.bottom - 22;
    const hitsName = placed.some(
      ({ box: other }) => x < other.x + other.width + 8 && other.x < x + width + 8,
    );
    if (!hitsEdge && !hitsName) placed.push({ name, box });
  }
  return placed;
}
