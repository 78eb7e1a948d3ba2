import { memo, useMemo } from 'react';
import { Circle, Line, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { formatWithUnit } from '@/shared/units/format';
import { UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';
import { ChartBox, type ChartSize } from './ChartBox';
import { ChartText } from './ChartText';
import { DragSurface } from './DragSurface';
import { bandModel, type BandAxis, type BandData, type BandModel } from './geometry/bandModel';
import { nearestIndex } from './geometry/interpolate';
import { shortTime } from './geometry/timeWords';
import { KeyList, type KeyEntry } from './KeyList';
import { PlaceAxis } from './PlaceAxis';
import { Reading, readingBox, type ReadingText } from './Reading';
import { TimeAxis } from './TimeAxis';
import { ValueAxis } from './ValueAxis';

export interface BandChartProps {
  /** What is drawn, in a sentence. */
  label: string;
  axis: BandAxis;
  quantity: Extract<Quantity, 'elevation' | 'depth' | 'flow'>;
  /** Keep the same object while only the cursor moves. */
  data: BandData;
  /** Words for what is drawn; the cursor reads line and band out. */
  names: { line: string; band?: string; level?: string; compare?: string };
  /** Chosen time, s, or chainage, m. */
  at: number | null;
  onChange?: (at: number) => void;
  unitSystem: UnitSystem;
  height?: number;
  initialWidth?: number;
}

/** A curve within its band, over time or along the reach, read out at the cursor. */
export const BandChart = memo(function BandChart(props: BandChartProps) {
  const { height = 200, onChange, data } = props;
  return (
    <ChartBox
      label={sentence(props)}
      unit={UNITS[props.unitSystem][props.quantity].symbol}
      height={height}
      initialWidth={props.initialWidth}
      over={(size) => (onChange ? <Drag {...props} onChange={onChange} size={size} /> : null)}
      legend={data.x.length ? <Key {...props} /> : null}
    >
      {(size) => (data.x.length ? <Drawing {...props} size={size} /> : null)}
    </ChartBox>
  );
});

/** One line alone is told by the title. */
function Key({ data, names }: BandChartProps) {
  const { colours } = useTheme();
  const entries: KeyEntry[] = [{ words: names.line, colour: colours.water }];
  if (data.band && names.band)
    entries.push({ words: names.band, colour: colours.waterTint, as: 'band' });
  if (data.compare && names.compare)
    entries.push({ words: names.compare, colour: colours.soft, dash: '5 4' });
  return entries.length > 1 ? <KeyList entries={entries} /> : null;
}

type Sized = BandChartProps & { size: ChartSize };

function useModel({ size: { width, height }, data, axis, quantity, unitSystem }: Sized) {
  return useMemo(
    () => bandModel({ width, height }, data, axis, quantity, unitSystem),
    [width, height, data, axis, quantity, unitSystem],
  );
}

/** Rests at the times or places that have values. */
function Drag(props: Sized & { onChange: (at: number) => void }) {
  const { invert } = useModel(props);
  const { x } = props.data;
  return (
    <DragSurface
      onDrag={(px) => props.onChange(x[nearestIndex(x, invert(px))])}
      style={props.size}
    />
  );
}

function Drawing(props: Sized) {
  const model = useModel(props);
  const { frame, timeTicks, placeTicks } = model;
  return (
    <>
      <ValueAxis frame={frame} ticks={model.valueTicks} />
      {timeTicks ? (
        <TimeAxis frame={frame} ticks={timeTicks} />
      ) : (
        <>
          <PlaceAxis frame={frame} ticks={placeTicks} />
          <ChartText x={frame.right} y={frame.bottom - 6} anchor="end">
            {`chainage, ${UNITS[props.unitSystem].chainage.symbol}`}
          </ChartText>
        </>
      )}
      <Curves model={model} />
      <Level {...props} model={model} />
      <Cursor {...props} model={model} />
    </>
  );
}

const Curves = memo(function Curves({ model }: { model: BandModel }) {
  const { colours } = useTheme();
  const { band, compare, ground, line } = model;
  return (
    <>
      {band ? <Path d={band} fill={colours.waterTint} /> : null}
      {ground ? (
        <>
          <Path d={ground.fill} fill={colours.earthTint} />
          <Path d={ground.edge} fill="none" stroke={colours.earth} strokeWidth={1.5} />
        </>
      ) : null}
      {compare ? (
        <Path
          d={compare.path}
          fill="none"
          stroke={colours.soft}
          strokeWidth={1.25}
          strokeDasharray="5 4"
        />
      ) : null}
      <Path
        d={line.path}
        fill="none"
        stroke={colours.water}
        strokeWidth={2}
        strokeLinejoin="round"
      />
    </>
  );
});

function Level({ data, names, model }: Sized & { model: BandModel }) {
  const { colours } = useTheme();
  const { level } = data;
  if (level == null) return null;
  const { frame } = model;
  const y = model.yOf(level);
  return (
    <>
      <Line
        x1={frame.left}
        x2={frame.right}
        y1={y}
        y2={y}
        stroke={colours.ochre}
        strokeWidth={1.5}
        strokeDasharray="8 4"
      />
      <ChartText x={frame.left + 4} y={y - 5} tone="ochre" strong halo>
        {names.level ?? 'level'}
      </ChartText>
    </>
  );
}

function Cursor(props: Sized & { model: BandModel }) {
  const { at, data, model } = props;
  const { colours } = useTheme();
  if (at === null) return null;
  const k = nearestIndex(data.x, at);
  const { frame, line, edges, compare } = model;
  const x = model.xOf(data.x[k]);
  const y = model.yOf(data.line[k]);
  const texts = readingsAt(props, k);
  const bounds = { x: frame.left, y: 0, width: frame.right - frame.left, height: frame.bottom };
  const lines = [line, ...edges, ...(compare ? [compare] : [])];
  const box = readingBox(texts, { x, y }, bounds, { lines });
  return (
    <>
      <Line x1={x} x2={x} y1={4} y2={frame.bottom} stroke={colours.ink} strokeWidth={1.25} />
      <Circle cx={x} cy={y} r={3.5} fill={colours.card} stroke={colours.ink} strokeWidth={1.5} />
      <Reading texts={texts} box={box} from={x} />
    </>
  );
}

function readingsAt(
  { data, names, quantity, unitSystem }: BandChartProps,
  k: number,
): ReadingText[] {
  const value = (si: number) => formatWithUnit(si, quantity, unitSystem);
  const texts: ReadingText[] = [{ text: `${names.line} ${value(data.line[k])}`, strong: true }];
  if (data.band && names.band)
    texts.push({
      text: `${names.band} ${value(data.band.low[k])} to ${value(data.band.high[k])}`,
    });
  return texts;
}

function sentence(props: BandChartProps): string {
  const { label, at, axis, data, unitSystem } = props;
  if (!data.x.length) return `${label}: no values`;
  if (at === null) return label;
  const k = nearestIndex(data.x, at);
  const span = data.x[data.x.length - 1] - data.x[0];
  const where =
    axis === 'time'
      ? shortTime(data.x[k], span)
      : formatWithUnit(data.x[k], 'chainage', unitSystem);
  const words = readingsAt(props, k).map(({ text }) => text);
  return `${label}; at ${where}: ${words.join(', ')}`;
}
