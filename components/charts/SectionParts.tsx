import { Line, Rect } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { groundAt } from '@/shared/reaches/sectionGeometry';
import { ChartText } from './ChartText';
import type { SectionShape } from './geometry/crossSectionModel';
import type { Frame } from './geometry/frame';

interface SectionPartsProps {
  section: SectionShape;
  frame: Frame;
  /** px of an offset and of an elevation, m. */
  px: (offset: number) => number;
  py: (elevation: number) => number;
}

/** Storage parts as a band above the ground, embankments as posts up to their crest. */
export function SectionParts({ section, frame, px, py }: SectionPartsProps) {
  const { colours } = useTheme();
  const { storage = [], embankments = {} } = section;
  const inside = (x: number) => Math.min(Math.max(x, frame.left), frame.right);
  const posts = [embankments.left, embankments.right].flatMap((post) => (post ? [post] : []));
  return (
    <>
      {storage.map(({ from, to, flowsAbove }) => (
        <StorageBand
          key={from}
          from={inside(px(from))}
          to={inside(px(to))}
          top={frame.top}
          lower={flowsAbove === undefined ? null : py(flowsAbove)}
        />
      ))}
      {posts.map(({ offset, crest }) => (
        <Line
          key={offset}
          x1={px(offset)}
          x2={px(offset)}
          y1={py(groundAt({ points: section.points.map(([y, z]) => [y, z]) }, offset))}
          y2={py(crest)}
          stroke={colours.earth}
          strokeWidth={5}
        />
      ))}
    </>
  );
}

interface StorageBandProps {
  from: number;
  to: number;
  top: number;
  /** Where water flows again, px. */
  lower: number | null;
}

function StorageBand({ from, to, top, lower }: StorageBandProps) {
  const { colours } = useTheme();
  const fits = to - from > 56;
  return (
    <>
      <Rect
        x={from}
        y={top}
        width={Math.max(1, to - from)}
        height={14}
        fill={colours.ochreTint}
        stroke={colours.ochre}
        strokeWidth={1}
      />
      {fits ? (
        <ChartText x={(from + to) / 2} y={top + 11} anchor="middle" tone="ochre">
          stores
        </ChartText>
      ) : null}
      {lower === null ? null : (
        <Line
          x1={from}
          x2={to}
          y1={lower}
          y2={lower}
          stroke={colours.ochre}
          strokeWidth={1.25}
          strokeDasharray="2 3"
        />
      )}
    </>
  );
}
