import { memo, useMemo } from 'react';
import { Ellipse, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import type { StructureBody } from '@/shared/scenarios/structures/schemas';
import type { Shape } from '@/shared/structures/crests';
import { structureMarks } from '@/shared/structures/structureMarks';
import { STRUCTURE_NAMES } from '@/shared/structures/structureWords';
import { formatWithUnit } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { ChartBox, type ChartSize } from './ChartBox';
import { ChartText } from './ChartText';
import { frontShapes, frontViewModel, type FrontShape } from './geometry/frontViewModel';
import { bandPath, linePath, project } from './geometry/paths';
import { PlaceAxis } from './PlaceAxis';
import { ValueAxis } from './ValueAxis';

interface FrontViewProps {
  structure: StructureBody;
  /** The section where it stands, m. */
  section: Shape;
  unitSystem: UnitSystem;
  height?: number;
  initialWidth?: number;
}

/** A structure in its section, looking downstream, as it is typed: what holds the water full, what lets it through open. */
export const FrontView = memo(function FrontView(props: FrontViewProps) {
  const { height = 180, initialWidth } = props;
  return (
    <ChartBox
      label={sentence(props)}
      unit={`elevation in ${UNITS[props.unitSystem].elevation.symbol}`}
      {...{ height, initialWidth }}
    >
      {(size) => <Drawing {...props} size={size} />}
    </ChartBox>
  );
});

function Drawing({ structure, section, unitSystem, size }: FrontViewProps & { size: ChartSize }) {
  const { width, height } = size;
  const { colours } = useTheme();
  const shapes = useMemo(() => frontShapes(structure, section), [structure, section]);
  const model = useMemo(
    () => frontViewModel({ width, height }, section, shapes, unitSystem),
    [width, height, section, shapes, unitSystem],
  );
  const { frame, px, py } = model;
  const xs = project(
    section.points.map(([offset]) => offset),
    px,
  );
  const ys = project(
    section.points.map(([, level]) => level),
    py,
  );
  const path = ({ points }: FrontShape) =>
    linePath(
      project(
        points.map(([x]) => x),
        px,
      ),
      project(
        points.map(([, z]) => z),
        py,
      ),
    );
  const isClosed = structure.kind === 'bridge';
  return (
    <>
      <ValueAxis frame={frame} ticks={model.yTicks} />
      {shapes
        .filter(({ role }) => role === 'body')
        .map((shape, i) => (
          <Path
            key={i}
            d={isClosed ? path(shape) : holding(shape, px, py, frame.bottom)}
            fill={colours.line}
            stroke={colours.ink}
            strokeWidth={isClosed ? 1.25 : 0}
          />
        ))}
      <Path d={bandPath(xs, ys, frame.bottom)} fill={colours.earthTint} />
      <Path d={linePath(xs, ys)} fill="none" stroke={colours.earth} strokeWidth={1.5} />
      {isClosed
        ? null
        : shapes
            .filter(({ role }) => role === 'body')
            .map((shape, i) => (
              <Path key={i} d={path(shape)} fill="none" stroke={colours.ink} strokeWidth={1.5} />
            ))}
      {shapes.map((shape, i) => {
        if (shape.role === 'body') return null;
        const look = {
          fill: shape.role === 'opening' ? colours.card : 'none',
          fillOpacity: 0.85,
          stroke: colours.ink,
          strokeWidth: shape.role === 'opening' ? 1.5 : 1,
          strokeDasharray: shape.role === 'growth' ? '4 3' : undefined,
        };
        const { circle } = shape;
        return circle ? (
          <Ellipse
            key={i}
            cx={px(circle.offset)}
            cy={py(circle.level)}
            rx={px(circle.offset + circle.radius) - px(circle.offset)}
            ry={py(circle.level) - py(circle.level + circle.radius)}
            {...look}
          />
        ) : (
          <Path key={i} d={path(shape)} {...look} />
        );
      })}
      <PlaceAxis frame={frame} ticks={model.xTicks} />
      <ChartText x={frame.right} y={frame.bottom - 5} anchor="end" tone="earth">
        {`offset, ${UNITS[unitSystem].length.symbol}`}
      </ChartText>
    </>
  );
}

/** From the crest down to the foot of the drawing; the ground is laid over it. */
function holding(
  { points }: FrontShape,
  px: (offset: number) => number,
  py: (level: number) => number,
  foot: number,
): string {
  return bandPath(
    project(
      points.map(([x]) => x),
      px,
    ),
    project(
      points.map(([, z]) => z),
      py,
    ),
    foot,
  );
}

function sentence({ structure, unitSystem }: FrontViewProps): string {
  const level = (m: number) => formatWithUnit(m, 'elevation', unitSystem);
  const [mark] = structureMarks([structure]);
  const parts = [`${STRUCTURE_NAMES[structure.kind]} ${structure.id}, looking downstream`];
  if (mark?.top != null) parts.push(`top at ${level(mark.top)}`);
  if (mark?.foot != null) parts.push(`foot at ${level(mark.foot)}`);
  return parts.join('; ');
}
