import { useMemo, useState } from 'react';
import { Circle, Line, Path, Rect } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import type { CaseCurves } from '@/shared/verificationCases/types';
import { formatError, placeText } from '@/shared/verificationCases/words';
import { ChartBox, type ChartSize } from './ChartBox';
import { ChartText } from './ChartText';
import { DragSurface } from './DragSurface';
import {
  comparisonModel,
  type ComparedQuantity,
  type ComparisonModel,
} from './geometry/comparisonModel';
import { nearestIndex } from './geometry/interpolate';
import { PlaceAxis } from './PlaceAxis';
import { TimeAxis } from './TimeAxis';
import { ValueAxis } from './ValueAxis';

interface Props {
  /** What is drawn, e.g. `Stage, dam break onto a dry bed`. */
  label: string;
  /** SI. Keep the same object while only the cursor moves. */
  curves: CaseCurves;
  quantity: ComparedQuantity;
  height?: number;
  initialWidth?: number;
}

/** Computed values as rings over the exact line; press or drag to read both out. */
export function Comparison({ label, curves, quantity, height = 220, initialWidth }: Props) {
  const [chosen, setChosen] = useState<number | null>(null);
  const { computed, exact } = curves[quantity];
  const reading =
    chosen === null
      ? ''
      : `; at ${placeText(curves.along, curves.at[chosen])} computed ${value(computed[chosen], quantity)}, exact ${value(exact[chosen], quantity)}`;
  return (
    <ChartBox
      label={`${label}: computed over exact${reading}`}
      unit={curves.along === 'time' ? UNIT[quantity] : `${UNIT[quantity]}, along chainage, m`}
      height={height}
      initialWidth={initialWidth}
      over={(size) => <Drag curves={curves} quantity={quantity} size={size} onChoose={setChosen} />}
    >
      {(size) => <Drawing curves={curves} quantity={quantity} size={size} chosen={chosen} />}
    </ChartBox>
  );
}

type Sized = Pick<Props, 'curves' | 'quantity'> & { size: ChartSize };

function useModel({ size, curves, quantity }: Sized) {
  const { width, height } = size;
  return useMemo(
    () => comparisonModel({ width, height }, curves, quantity),
    [width, height, curves, quantity],
  );
}

function Drag(props: Sized & { onChoose: (index: number) => void }) {
  const { x } = useModel(props).frame;
  const { at } = props.curves;
  return (
    <DragSurface
      onDrag={(px) => props.onChoose(nearestIndex(at, x.invert(px)))}
      style={props.size}
    />
  );
}

function Drawing(props: Sized & { chosen: number | null }) {
  const { curves, quantity, chosen } = props;
  const model = useModel(props);
  const { frame, time, xTicks, yTicks } = model;
  return (
    <>
      <ValueAxis frame={frame} ticks={yTicks} />
      <Lines model={model} />
      {time ? <TimeAxis frame={frame} ticks={time} /> : <PlaceAxis frame={frame} ticks={xTicks} />}
      {chosen === null ? (
        <Legend right={frame.right} />
      ) : (
        <Cursor {...{ curves, quantity, frame, chosen }} />
      )}
    </>
  );
}

function Lines({ model }: { model: ComparisonModel }) {
  const { colours } = useTheme();
  const { frame } = model;
  return (
    <>
      {model.water ? <Path d={model.water} fill={colours.waterTint} /> : null}
      {model.ground ? <Path d={model.ground} fill={colours.earthTint} /> : null}
      {model.groundLine ? (
        <Path d={model.groundLine} fill="none" stroke={colours.earth} strokeWidth={1.25} />
      ) : null}
      {model.leftOut.map(([from, to]) => (
        <Rect
          key={from}
          x={from}
          y={frame.bottom - 4}
          width={to - from}
          height={4}
          fill={colours.ochre}
        />
      ))}
      <Path
        d={model.exact}
        fill="none"
        stroke={colours.ink}
        strokeWidth={1.25}
        strokeLinejoin="round"
      />
      {model.dots.map(({ x, y }) => (
        <Circle
          key={x}
          cx={x}
          cy={y}
          r={2.6}
          fill={colours.card}
          stroke={colours.water}
          strokeWidth={1.25}
        />
      ))}
    </>
  );
}

/** Along the top: a ring and a line with their words. */
function Legend({ right }: { right: number }) {
  const { colours } = useTheme();
  return (
    <>
      <Circle
        cx={right - 140}
        cy={10}
        r={2.6}
        fill={colours.card}
        stroke={colours.water}
        strokeWidth={1.25}
      />
      <ChartText x={right - 132} y={14}>
        computed
      </ChartText>
      <Line
        x1={right - 62}
        x2={right - 42}
        y1={10}
        y2={10}
        stroke={colours.ink}
        strokeWidth={1.25}
      />
      <ChartText x={right} y={14} anchor="end">
        exact
      </ChartText>
    </>
  );
}

interface CursorProps extends Pick<Props, 'curves' | 'quantity'> {
  frame: ComparisonModel['frame'];
  chosen: number;
}

/** Its reading stands along the top, where no curve is. */
function Cursor({ curves, quantity, frame, chosen }: CursorProps) {
  const { colours } = useTheme();
  const { computed, exact } = curves[quantity];
  const x = frame.x(curves.at[chosen]);
  return (
    <>
      <Line
        x1={x}
        x2={x}
        y1={frame.top - 4}
        y2={frame.bottom}
        stroke={colours.ink}
        strokeWidth={1}
      />
      <ChartText x={frame.right} y={14} anchor="end" tone="ink">
        {`${placeText(curves.along, curves.at[chosen])}: computed ${value(computed[chosen], quantity)}, exact ${value(exact[chosen], quantity)}`}
      </ChartText>
    </>
  );
}

/** With the digits that tell computed from exact. */
const value = (si: number, quantity: ComparedQuantity): string =>
  `${formatError(si).replace(/^-/, '−')} ${UNIT[quantity]}`;

const UNIT: Record<ComparedQuantity, string> = { stage: 'm', flow: 'm³/s' };
