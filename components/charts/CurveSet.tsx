import { memo, useMemo } from 'react';
import { Line, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { UNITS } from '@/shared/units/units';
import { ChartBox, type ChartSize } from './ChartBox';
import { ChartText } from './ChartText';
import { CurveLegend } from './CurveLegend';
import { lookOf } from './curveLooks';
import { CurveMark } from './CurveMark';
import { DragSurface } from './DragSurface';
import {
  curveSetModel,
  type CurveSetInput,
  type CurveSetModel,
  type DrawnCurve,
} from './geometry/curveSetModel';
import { bandPath, linePath } from './geometry/paths';
import { PlaceAxis } from './PlaceAxis';
import { TimeAxis } from './TimeAxis';
import { ValueAxis } from './ValueAxis';

export interface CurveSetProps extends CurveSetInput {
  /** What is drawn, e.g. `Stage at Tornick bridge`. */
  label: string;
  /** Name of the values over the axis where it is not their own. */
  valueName?: string;
  footName?: string;
  /** Place, time or number of the cursor, SI; null for none. */
  at?: number | null;
  /** Left out: the drawing only shows. */
  onChange?: (at: number) => void;
  height?: number;
  initialWidth?: number;
}

/** Several curves and rows of points, told apart by colour, dash and mark, and named with their values below. */
export function CurveSet(props: CurveSetProps) {
  const { label, curves, onChange, height = 260, at = null } = props;
  const names = curves.map(({ name }) => name).join('; ');
  return (
    <ChartBox
      label={`${label}: ${names}`}
      height={height}
      initialWidth={props.initialWidth}
      over={(size) => (onChange ? <Drag {...props} onChange={onChange} size={size} /> : null)}
      legend={<CurveLegend {...props} at={at} />}
    >
      {(size) => <Drawing {...props} size={size} />}
    </ChartBox>
  );
}

type Sized = CurveSetProps & { size: ChartSize };

function useModel({ size, curves, ground, foot, value, unitSystem }: Sized) {
  const { width, height } = size;
  return useMemo(
    () => curveSetModel({ width, height }, { curves, ground, foot, value, unitSystem }),
    [width, height, curves, ground, foot, value, unitSystem],
  );
}

function Drag(props: Sized & { onChange: (at: number) => void }) {
  const { frame } = useModel(props);
  const { foot, unitSystem, onChange, size } = props;
  const si = foot === 'place' ? UNITS[unitSystem].chainage.si : 1;
  return (
    <DragSurface
      style={size}
      onDrag={(px) => {
        const [from, to] = frame.x.domain();
        onChange(Math.min(to, Math.max(from, frame.x.invert(px))) * si);
      }}
    />
  );
}

function Drawing(props: Sized) {
  const model = useModel(props);
  const { colours } = useTheme();
  const { frame, footOf } = model;
  const { foot, unitSystem, at = null } = props;
  const x = at === null ? null : footOf(at);
  return (
    <>
      <ValueAxis frame={frame} ticks={model.valueTicks} />
      {model.timeTicks ? (
        <TimeAxis frame={frame} ticks={model.timeTicks} />
      ) : (
        <PlaceAxis frame={frame} ticks={model.footTicks} />
      )}
      <Curves model={model} />
      <ChartText x={frame.left} y={14}>
        {valueTitle(props)}
      </ChartText>
      {foot === 'time' ? null : (
        <ChartText x={frame.right} y={frame.bottom - 6} anchor="end">
          {foot === 'place'
            ? `chainage, ${UNITS[unitSystem].chainage.symbol}`
            : (props.footName ?? '')}
        </ChartText>
      )}
      {x !== null && x >= frame.left - 1 && x <= frame.right + 1 ? (
        <Line x1={x} x2={x} y1={18} y2={frame.bottom} stroke={colours.ink} strokeWidth={1.25} />
      ) : null}
    </>
  );
}

function valueTitle({ value, valueName, unitSystem }: CurveSetProps): string {
  if (value === 'number') return valueName ?? '';
  const { symbol } = UNITS[unitSystem][value];
  if (valueName) return `${valueName}, ${symbol}`;
  return value === 'elevation' ? `stage, ${symbol} above datum` : `${value}, ${symbol}`;
}

/** What does not follow the cursor. */
const Curves = memo(function Curves({ model }: { model: CurveSetModel }) {
  const { colours } = useTheme();
  const { ground, frame } = model;
  return (
    <>
      {ground ? (
        <>
          <Path d={bandPath(ground.x, ground.y, frame.bottom)} fill={colours.earthTint} />
          <Path
            d={linePath(ground.x, ground.y)}
            fill="none"
            stroke={colours.earth}
            strokeWidth={1.5}
          />
        </>
      ) : null}
      {model.curves.map((drawn, k) => (
        <One key={k} drawn={drawn} />
      ))}
    </>
  );
});

function One({ drawn: { curve, path, marks } }: { drawn: DrawnCurve }) {
  const { colours } = useTheme();
  const { colour, dash, width } = lookOf(curve.look);
  return (
    <>
      {path ? (
        <Path
          d={path}
          fill="none"
          stroke={colours[colour]}
          strokeWidth={width}
          strokeDasharray={dash}
          strokeLinejoin="round"
        />
      ) : null}
      {marks.map((mark, i) => [
        curve.reach ? (
          <Line
            key={`bar ${i}`}
            x1={mark.x}
            x2={mark.x}
            y1={mark.up}
            y2={mark.down}
            stroke={colours[colour]}
            strokeWidth={1.25}
          />
        ) : null,
        <CurveMark key={i} x={mark.x} y={mark.y} look={curve.look} />,
      ])}
    </>
  );
}
