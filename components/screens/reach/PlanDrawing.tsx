import { useMemo } from 'react';
import { Circle, Line, Path } from 'react-native-svg';
import type { ChartSize } from '@/components/charts/ChartBox';
import { ChartText } from '@/components/charts/ChartText';
import { useTheme } from '@/components/theme/useTheme';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Position } from '@/shared/reaches/plan/geoJson';
import type { ReachSection } from '@/shared/reaches/types';
import { formatNumber } from '@/shared/units/format';
import { fromSi, UNITS } from '@/shared/units/units';
import { planModel, type PlanModel } from './planModel';

interface PlanDrawingProps {
  /** Those with coordinates. */
  placed: readonly ReachSection[];
  /** Those that the drawing is as large as. */
  inView: readonly ReachSection[];
  section: ReachSection;
  /** Outlines of water, in the coordinates of the sections. */
  rings: readonly Position[][];
  size: ChartSize;
  onChoose: (chainage: number) => void;
}

/** The sections and the river from above, at one scale both ways; a press on a section chooses it. */
export function PlanDrawing({ placed, inView, section, rings, size, onChoose }: PlanDrawingProps) {
  const { colours } = useTheme();
  const { width, height } = size;
  const model = useMemo(
    () => planModel(placed, { width, height }, inView),
    [placed, inView, width, height],
  );
  const chosen = model.lines.find(({ id }) => id === section.id);
  return (
    <>
      {rings.map((ring, i) => (
        <Path
          key={i}
          d={`${model.pathOf(ring)}Z`}
          fill={colours.waterTint}
          stroke={colours.waterTint}
          strokeWidth={1}
        />
      ))}
      {rings.length > 0 ? null : (
        <Path
          d={model.river}
          fill="none"
          stroke={colours.waterTint}
          strokeWidth={8}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      )}
      <Path
        d={model.river}
        fill="none"
        stroke={colours.water}
        strokeWidth={1.75}
        strokeLinejoin="round"
      />
      {model.lines.map(({ id, chainage, d }) => (
        <Path
          key={id}
          d={d}
          fill="none"
          stroke={id === section.id ? colours.ink : colours.soft}
          strokeWidth={id === section.id ? 2.5 : 1}
          onPress={() => onChoose(chainage)}
        />
      ))}
      {chosen ? (
        <Circle
          cx={chosen.at[0]}
          cy={chosen.at[1]}
          r={5}
          fill={colours.card}
          stroke={colours.ink}
          strokeWidth={4}
        />
      ) : null}
      <ScaleBar model={model} height={height} />
    </>
  );
}

function ScaleBar({ model, height }: { model: PlanModel; height: number }) {
  const { colours } = useTheme();
  const system = useUnitSystem();
  const { symbol, si } = UNITS[system].length;
  const length = model.scaleBar(si);
  const y = height - 10;
  return (
    <>
      <Line
        x1={8}
        x2={8 + length * si * model.pxPerMetre}
        y1={y}
        y2={y}
        stroke={colours.ink}
        strokeWidth={2}
      />
      <ChartText x={8} y={y - 6}>
        {`${formatNumber(fromSi(length * si, 'length', system), 0)} ${symbol}`}
      </ChartText>
    </>
  );
}
