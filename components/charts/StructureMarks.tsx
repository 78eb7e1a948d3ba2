import { memo } from 'react';
import { Line, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import type { StructureMark } from '@/shared/structures/structureMarks';
import { fromSi, type UnitSystem } from '@/shared/units/units';
import { ChartText } from './ChartText';
import type { Frame } from './geometry/frame';
import { valueAt } from './geometry/interpolate';
import type { LongProfile } from './geometry/longProfile';
import { structureLabels } from './geometry/structureLabels';

interface Props {
  structures: readonly StructureMark[];
  profile: LongProfile;
  frame: Frame;
  unitSystem: UnitSystem;
  /** Bottom of a breach at the moment by id, m; left out: as it stands before it fails. */
  bottoms?: ReadonlyMap<string, number>;
  /** What each does at the moment, by id. */
  words?: ReadonlyMap<string, string>;
}

/** Structures in a long section: a wall from the bed to the crest, open where water passes beneath, named above. */
export const StructureMarks = memo(function StructureMarks(props: Props) {
  const { structures, profile, frame, unitSystem, bottoms, words } = props;
  const { colours } = useTheme();
  const x = (chainage: number) => frame.x(fromSi(chainage, 'chainage', unitSystem));
  const y = (level: number) => frame.y(fromSi(level, 'elevation', unitSystem));
  const drawn = structures.map((mark) => {
    const bed = valueAt(profile.chainages, profile.bed, mark.chainage);
    const px = x(mark.chainage);
    return { mark, px, bed: y(bed), ...wallOf(mark, bed, bottoms?.get(mark.id), y) };
  });
  const labels = structureLabels(
    drawn.map(({ mark, px, top }) => ({
      x: px,
      y: top,
      text: words?.get(mark.id) ? `${mark.id}: ${words.get(mark.id)}` : mark.id,
    })),
    frame,
  );
  return (
    <>
      {drawn.map(({ mark, px, walls, top }) => (
        <Path
          key={mark.id}
          d={`${walls.map(([from, to]) => `M${px},${from}V${to}`).join('')}M${px - 5},${top}H${px + 5}`}
          stroke={colours.ink}
          strokeWidth={3}
          fill="none"
        />
      ))}
      {labels.map(({ text, x: left, y: base, fromX, fromY }) => (
        <ChartText key={`${text} ${fromX}`} x={left} y={base} tone="ink" halo>
          {text}
        </ChartText>
      ))}
      {labels.map(({ text, y: base, fromX, fromY }) =>
        fromY - base > 14 ? (
          <Line
            key={text}
            x1={fromX}
            x2={fromX}
            y1={base + 4}
            y2={fromY - 3}
            stroke={colours.soft}
            strokeWidth={1}
          />
        ) : null,
      )}
    </>
  );
});

/** Upright pieces in px, from one level to another, and the top of them. */
function wallOf(
  { kind, foot, top }: StructureMark,
  bed: number,
  bottom: number | undefined,
  y: (level: number) => number,
): { walls: [number, number][]; top: number } {
  const crest = y(top ?? foot ?? bed);
  if (kind === 'bridge') return { walls: [[crest, y(foot ?? bed)]], top: crest };
  if (kind === 'breach') {
    const low = y(bottom ?? top ?? bed);
    return { walls: [[low, y(bed)]], top: low };
  }
  return { walls: [[crest, y(bed)]], top: crest };
}
