import { useMemo } from 'react';
import { Line, Path } from 'react-native-svg';
import { ChartBox, type ChartSize } from '@/components/charts/ChartBox';
import { linePath, project } from '@/components/charts/geometry/paths';
import { KeyList } from '@/components/charts/KeyList';
import { PlaceAxis } from '@/components/charts/PlaceAxis';
import { ValueAxis } from '@/components/charts/ValueAxis';
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
        unit={`elevation and offset in ${UNITS[system].length.symbol}`}
        height={240}
        legend={
          <KeyList
            entries={[
              {
                words: row.before ? names[0] : `${names[0]}: none`,
                colour: colours.soft,
                dash: '5 4',
              },
              { words: row.after ? names[1] : `${names[1]}: none`, colour: colours.earth },
            ]}
          />
        }
      >
        {(size) => <Drawing row={row} size={size} />}
      </ChartBox>
      <Txt variant="small" tone="soft">
        Elevation in {UNITS[system].elevation.symbol} above datum, offset in{' '}
        {UNITS[system].length.symbol}, looking downstream.
      </Txt>
    </>
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
