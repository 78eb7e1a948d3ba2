import { Line } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { ChartText } from './ChartText';
import type { Frame } from './geometry/frame';
import type { LevelLine } from './geometry/levelLines';

/** Levels across a hydrograph. */
export function LevelLines({ lines, frame }: { lines: readonly LevelLine[]; frame: Frame }) {
  const { colours } = useTheme();
  return lines.map(({ y }, k) => (
    <Line
      key={k}
      x1={frame.left}
      x2={frame.right}
      y1={y}
      y2={y}
      stroke={colours.ochre}
      strokeWidth={1.25}
      strokeDasharray="8 3 2 3"
    />
  ));
}

/** Their names, each at its left end; drawn last, so that the cursor does not cross them out. */
export const LevelNames = ({ lines }: { lines: readonly LevelLine[] }) =>
  lines.map(({ name, box }, k) =>
    box ? (
      <ChartText key={k} x={box.x} y={box.y + 12} tone="ochre" halo>
        {name}
      </ChartText>
    ) : null,
  );
