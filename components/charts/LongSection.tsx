import { memo, useMemo } from 'react';
import { Circle, Line, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import type { StructureMark } from '@/shared/structures/structureMarks';
import { formatWithUnit } from '@/shared/units/format';
import { fromSi, UNITS, type UnitSystem } from '@/shared/units/units';
import { ChartBox } from './ChartBox';
import { ChartText, CHART_TEXT_SIZE } from './ChartText';
import { DragSurface } from './DragSurface';
import { nearestIndex, valueAt } from './geometry/interpolate';
import {
  longSectionFrame,
  wetSurface,
  withRoomFor,
  type LongProfile,
  type ObservedLevel,
} from './geometry/longProfile';
import { bandPath, linePath, project } from './geometry/paths';
import { placesAlong } from './geometry/placesAlong';
import { PIN, pinBox, pointPins, type Pin } from './geometry/pointPins';
import { LevelMarks } from './LevelMarks';
import { MovingDot, MovingWater, type LiveWater } from './MovingWater';
import { ObservedMarks } from './ObservedMarks';
import { PlaceAxis } from './PlaceAxis';
import { PointPins, type RaisedPoint } from './PointPins';
import { PointPresses } from './PointPresses';
import { Reading, readingBox, type ReadingText } from './Reading';
import { stationNames, type StationName } from './geometry/stationNames';
import { StationMarks } from './StationMarks';
import { StructureMarks } from './StructureMarks';
import { ValueAxis } from './ValueAxis';

export interface LongSectionProps {
  /** Bed, banks and highest water by chainage, m. Keep it the same object while only the water moves. */
  profile: LongProfile;
  /** Water that moves by itself; `stage` and `reading` then only name values, a few times a second. */
  live?: LiveWater | null;
  /** Water surface of the moment at the same places, m; null for the bare reach. */
  stage?: ArrayLike<number> | null;
  sections: readonly { id: string; chainage: number }[];
  stations?: readonly { name: string; chainage: number }[];
  /** Levels named at stations, m. */
  levels?: readonly { chainage: number; level: number }[];
  /** Levels that a flood was seen at. */
  observed?: readonly ObservedLevel[];
  /** Points that were raised on places of the reach. */
  points?: readonly PlacedPoint[];
  onPoint?: (id: number) => void;
  /** What stands in the river; its breaches and its words as of the moment. */
  structures?: readonly StructureMark[];
  bottoms?: ReadonlyMap<string, number>;
  words?: ReadonlyMap<string, string>;
  /** Chosen place, m. */
  at: number | null;
  /** Water at the chosen place where it is known better than from the drawing, m. */
  reading?: { stage: number; peakStage: number } | null;
  /** Left out: the drawing only shows. */
  onChange?: (chainage: number) => void;
  unitSystem: UnitSystem;
  /** What the drawing shows beyond its name, e.g. the time of the water. */
  label?: string;
  height?: number;
  initialWidth?: number;
}

export interface PlacedPoint extends RaisedPoint {
  /** m. */
  chainage: number;
}

/** The reach from the side: ground as ground, water as water, the highest water dotted, the chosen place read out. */
export function LongSection(props: LongSectionProps) {
  const { sections, stations = NONE, structures = NONE, observed = NONE, points = NONE } = props;
  const { onChange, onPoint, at, height = 320 } = props;
  const profile = useMemo(
    () => withRoomFor(props.profile, structures, observed),
    [props.profile, structures, observed],
  );
  const stops = useMemo(
    () => placesAlong(sections, stations).map((place) => place.chainage),
    [sections, stations],
  );
  const label = [
    'Long section',
    props.label,
    observed.length ? `Observed levels: ${observed.length}` : '',
    at === null ? '' : sentenceAt(props, at),
  ];
  return (
    <ChartBox
      label={label.filter(Boolean).join('. ')}
      height={height}
      initialWidth={props.initialWidth}
      over={(size) => {
        const drag = (px: number) => {
          const frame = longSectionFrame(size, profile, props.unitSystem);
          const wanted = frame.x.invert(px) * UNITS[props.unitSystem].chainage.si;
          onChange?.(stops[nearestIndex(stops, wanted)]);
        };
        return onChange ? <DragSurface onDrag={drag} style={size} /> : null;
      }}
      controls={
        onPoint && points.length
          ? (size) => <Presses {...props} {...{ profile, points, onPoint, size }} />
          : undefined
      }
    >
      {(size) => <Drawing {...props} profile={profile} size={size} />}
    </ChartBox>
  );
}

type Sized = LongSectionProps & { size: { width: number; height: number } };

/** Boxes of the points above the highest water of their places, else above the bed. */
function usePins({ profile, points = NONE, unitSystem, size: { width, height } }: Sized) {
  return useMemo(() => {
    const frame = longSectionFrame({ width, height }, profile, unitSystem);
    const { bed, chainages, peakStage } = profile;
    const pinned = points.map(({ id, chainage }) => ({
      id,
      x: frame.x(fromSi(chainage, 'chainage', unitSystem)),
      y: frame.y(fromSi(valueAt(chainages, peakStage ?? bed, chainage), 'elevation', unitSystem)),
    }));
    return pointPins(pinned, frame);
  }, [width, height, profile, points, unitSystem]);
}

function Presses(props: Sized & Required<Pick<LongSectionProps, 'points' | 'onPoint'>>) {
  return <PointPresses pins={usePins(props)} points={props.points} onPoint={props.onPoint} />;
}

function Drawing(props: Sized) {
  const { profile, live = null, stage, reading, at, unitSystem, sections, size } = props;
  const { stations = NONE, levels = NONE, structures = NONE, bottoms, words } = props;
  const { observed = NONE, points = NONE } = props;
  const pins = usePins(props);
  const { colours } = useTheme();
  const { width, height } = size;
  const frame = useMemo(
    () => longSectionFrame({ width, height }, profile, unitSystem),
    [width, height, profile, unitSystem],
  );
  const lines = useMemo(() => {
    const x = project(profile.chainages, (m) => frame.x(fromSi(m, 'chainage', unitSystem)));
    const y = (row: ArrayLike<number>) =>
      project(row, (m) => frame.y(fromSi(m, 'elevation', unitSystem)));
    return {
      x,
      bed: y(profile.bed),
      peak: profile.peakStage ? y(profile.peakStage) : null,
      left: profile.leftBank ? y(profile.leftBank) : null,
      right: profile.rightBank ? y(profile.rightBank) : null,
    };
  }, [profile, frame, unitSystem]);
  const names = useMemo(
    () => stationNames(stations, profile, frame, unitSystem, CHART_TEXT_SIZE),
    [stations, profile, frame, unitSystem],
  );
  const y = useMemo(() => {
    const px = (m: number) => frame.y(fromSi(m, 'elevation', unitSystem));
    return { at0: px(0), perMetre: px(1) - px(0) };
  }, [frame, unitSystem]);
  const surface = stage
    ? project(wetSurface(profile.bed, stage), (m) => frame.y(fromSi(m, 'elevation', unitSystem)))
    : null;

  return (
    <>
      <ValueAxis frame={frame} ticks={frame.yTicks} />
      {live ? (
        <MovingWater {...{ live, y }} x={lines.x} bed={profile.bed} foot={frame.bottom} />
      ) : surface ? (
        <Path d={bandPath(lines.x, surface, lines.bed)} fill={colours.waterTint} />
      ) : null}
      <Ground lines={lines} foot={frame.bottom} />
      {surface && !live ? (
        <Path
          d={linePath(lines.x, surface)}
          fill="none"
          stroke={colours.water}
          strokeWidth={2}
          strokeLinejoin="round"
        />
      ) : null}
      <StationMarks
        sections={sections}
        stations={stations}
        names={names}
        profile={profile}
        frame={frame}
        unitSystem={unitSystem}
      />
      <LevelMarks {...{ levels, frame, unitSystem }} />
      <ObservedMarks {...{ observed, frame, unitSystem }} />
      <StructureMarks {...{ structures, profile, frame, unitSystem, bottoms, words }} />
      <PlaceAxis frame={frame} ticks={frame.xTicks} />
      <ChartText x={frame.left} y={14}>
        {`${stage || profile.peakStage ? 'stage' : 'elevation'}, ${UNITS[unitSystem].elevation.symbol} above datum`}
      </ChartText>
      <ChartText x={frame.right} y={frame.bottom - 6} anchor="end" tone="earth">
        {`chainage, ${UNITS[unitSystem].chainage.symbol}`}
      </ChartText>
      {at === null ? null : (
        <Cursor
          {...{ frame, profile, live, y, names, stage, reading, at, unitSystem, pins }}
          lines={lines}
          surface={surface}
        />
      )}
      <PointPins {...{ pins, points }} />
    </>
  );
}

interface Lines {
  x: Float64Array;
  bed: Float64Array;
  peak: Float64Array | null;
  left: Float64Array | null;
  right: Float64Array | null;
}

/** What does not move while the flood plays. */
const Ground = memo(function Ground({ lines, foot }: { lines: Lines; foot: number }) {
  const { colours } = useTheme();
  return (
    <>
      <Path d={bandPath(lines.x, lines.bed, foot)} fill={colours.earthTint} />
      {[lines.left, lines.right].map((bank, i) =>
        bank ? (
          <Path
            key={i}
            d={linePath(lines.x, bank)}
            fill="none"
            stroke={colours.earth}
            strokeWidth={1}
            strokeDasharray={i ? '1.5 4' : '8 4'}
          />
        ) : null,
      )}
      {lines.peak ? (
        <Path
          d={linePath(lines.x, lines.peak)}
          fill="none"
          stroke={colours.water}
          strokeWidth={1.25}
          strokeDasharray="3 3"
        />
      ) : null}
      <Path
        d={linePath(lines.x, lines.bed)}
        fill="none"
        stroke={colours.earth}
        strokeWidth={1.5}
        strokeLinejoin="round"
      />
    </>
  );
});

interface CursorProps extends ReadingOf {
  at: number;
  live: LiveWater | null;
  y: { at0: number; perMetre: number };
  frame: ReturnType<typeof longSectionFrame>;
  lines: Lines;
  surface: Float64Array | null;
  pins: readonly Pin[];
  names: readonly StationName[];
}

function Cursor(props: CursorProps) {
  const { at, frame, profile, live, stage, reading, unitSystem, lines, surface, pins } = props;
  const { names } = props;
  const { colours } = useTheme();
  const x = frame.x(fromSi(at, 'chainage', unitSystem));
  const level = reading?.stage ?? valueAt(profile.chainages, stage ?? profile.bed, at);
  const y = frame.y(fromSi(level, 'elevation', unitSystem));
  const texts = readings({ profile, stage, reading, unitSystem }, at);
  const bounds = {
    x: frame.left,
    y: 4,
    width: frame.right - frame.left,
    height: frame.bottom - 26,
  };
  const drawn = [surface, lines.bed, lines.peak, lines.left, lines.right].flatMap((row) =>
    row ? [{ x: lines.x, y: row }] : [],
  );
  const axisTitle = { x: frame.left, y: 0, width: 150, height: 18 };
  const taken = [axisTitle, ...names.map(({ box }) => box), ...pins.map(pinBox)];
  // Beside the numbers of points above the place, not below the ground for their sake.
  const gap = pins.some((pin) => Math.abs(pin.x - x) < PIN) ? PIN / 2 + 6 : undefined;
  const box = readingBox(texts, { x, y }, bounds, { lines: drawn, taken }, gap);
  return (
    <>
      <Line x1={x} x2={x} y1={10} y2={frame.bottom} stroke={colours.ink} strokeWidth={1.25} />
      {live ? (
        <MovingDot live={live} x={x} y={props.y} />
      ) : (
        <Circle cx={x} cy={y} r={5} fill={colours.card} stroke={colours.ink} strokeWidth={2} />
      )}
      <Reading texts={texts} box={box} from={x} />
    </>
  );
}

type ReadingOf = Pick<LongSectionProps, 'profile' | 'stage' | 'reading' | 'unitSystem'>;

function readings({ profile, stage, reading, unitSystem }: ReadingOf, at: number): ReadingText[] {
  const show = (m: number) => formatWithUnit(m, 'elevation', unitSystem);
  const drawn = (row: ArrayLike<number>) => valueAt(profile.chainages, row, at);
  if (!stage) return [{ text: `bed ${show(drawn(profile.bed))}`, strong: true }];
  const texts: ReadingText[] = [{ text: show(reading?.stage ?? drawn(stage)), strong: true }];
  const peak = reading?.peakStage ?? (profile.peakStage ? drawn(profile.peakStage) : null);
  if (peak !== null) texts.push({ text: `peak ${show(peak)}` });
  return texts;
}

function sentenceAt(of: ReadingOf, at: number): string {
  const values = readings(of, at).map(({ text }) => text);
  return `At ${formatWithUnit(at, 'chainage', of.unitSystem)}: ${values.join(', ')}`;
}

const NONE: never[] = [];
