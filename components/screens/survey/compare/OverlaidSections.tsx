import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Line, Path } from 'react-native-svg';
import { ChartBox, type ChartSize } from '@/components/charts/ChartBox';
import { linePath, project } from '@/components/charts/geometry/paths';
import { PlaceAxis } from '@/components/charts/PlaceAxis';
import { ValueAxis } from '@/components/charts/ValueAxis';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { SectionComparison } from '@/shared/reaches/compare/compareGeometries';
import { UNITS } from '@/shared/units/units';
import { editDrawingModel } from '../../reach/edit/editDrawingModel';
import { wholeWindow } from '../../reach/edit/sectionWindow';
import { nameOf } from './fateWords';

interface OverlaidSectionsProps {
  row: SectionComparison;
  names: readonly [string, string];
}

/** A section as it was, dashed, and as it is, drawn through; the level below which areas are compared. */
export function OverlaidSections({ row, names }: OverlaidSectionsProps) {
  const { colours } = useTheme();
  const system = useUnitSystem();
  return (
    <>
      <ChartBox
        label={`${nameOf(row)} looking downstream: ${names[0]} dashed, ${names[1]} drawn through`}
        height={240}
      >
        {(size) => <Drawing row={row} size={size} />}
      </ChartBox>
      <View style={styles.key}>
        <Key words={row.before ? names[0] : `${names[0]}: none`} stroke={colours.soft} dash="5 4" />
        <Key words={row.after ? names[1] : `${names[1]}: none`} stroke={colours.earth} />
      </View>
      <Txt variant="small" tone="soft">
        Elevation in {UNITS[system].elevation.symbol} above datum, offset in{' '}
        {UNITS[system].length.symbol}, looking downstream.
      </Txt>
    </>
  );
}

function Key({ words, stroke, dash }: { words: string; stroke: string; dash?: string }) {
  return (
    <View style={styles.entry}>
      <Svg width={28} height={10}>
        <Line x1={0} x2={28} y1={5} y2={5} stroke={stroke} strokeWidth={2} strokeDasharray={dash} />
      </Svg>
      <Txt variant="small">{words}</Txt>
    </View>
  );
}

function Drawing({ row, size }: { row: SectionComparison; size: ChartSize }) {
  const { before, after, level } = row;
  const { width, height } = size;
  const { colours } = useTheme();
  const system = useUnitSystem();
  const drawing = useMemo(() => {
    const points = [...(before?.points ?? []), ...(after?.points ?? [])];
    const model = editDrawingModel({ width, height }, points, wholeWindow({ points }), [], system);
    const line = (of: typeof before) =>
      of &&
      linePath(
        project(
          of.points.map(([y]) => y),
          model.px,
        ),
        project(
          of.points.map(([, z]) => z),
          model.py,
        ),
      );
    return { model, before: line(before), after: line(after) };
  }, [before, after, width, height, system]);
  const { frame, py, xTicks, yTicks } = drawing.model;
  return (
    <>
      <ValueAxis frame={frame} ticks={yTicks} />
      {level === null ? null : (
        <Line
          x1={frame.left}
          x2={frame.right}
          y1={py(level)}
          y2={py(level)}
          stroke={colours.ochre}
          strokeWidth={1}
          strokeDasharray="1 3"
        />
      )}
      {drawing.after ? (
        <Path d={drawing.after} fill="none" stroke={colours.earth} strokeWidth={2} />
      ) : null}
      {drawing.before ? (
        <Path
          d={drawing.before}
          fill="none"
          stroke={colours.soft}
          strokeWidth={1.5}
          strokeDasharray="5 4"
        />
      ) : null}
      <PlaceAxis frame={frame} ticks={xTicks} />
    </>
  );
}

const styles = StyleSheet.create({
  key: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.three, rowGap: space.half },
  entry: { flexDirection: 'row', alignItems: 'center', gap: space.one },
});
