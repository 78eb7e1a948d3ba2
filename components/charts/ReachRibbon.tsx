import { memo, useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Circle, Line, Path } from 'react-native-svg';
import { scaleLinear } from 'd3-scale';
import { touch } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';
import { nearestIndex } from './geometry/interpolate';
import { reachCurve } from './geometry/reachCurve';
import { placesAlong, placeName, type ReachPlace } from './geometry/placesAlong';
import { SliderSurface } from './SliderSurface';
import { useWidth } from './useWidth';

export interface ReachRibbonProps {
  sections: readonly { id: string; chainage: number }[];
  stations?: readonly { name: string; chainage: number }[];
  /** What asks for attention by place, e.g. survey advice. */
  advice?: readonly { chainage: number }[];
  /** What stands in the river. */
  structures?: readonly { id: string; chainage: number }[];
  /** Chosen place, m; null before one is chosen. */
  at: number | null;
  onChange: (chainage: number) => void;
  /** Places that can be chosen, m, rising; left out: every section and station. */
  restAt?: readonly number[];
  unitSystem: UnitSystem;
  /** Width until the layout is known, px. */
  initialWidth?: number;
}

const INSET = 12;
const SWAY = 7;

/** The river as one line, a tick a section: choose the place by touch, drag or arrow keys. */
export function ReachRibbon(props: ReachRibbonProps) {
  const { sections, stations = NONE, advice = NONE, structures = NONE } = props;
  const { at, onChange, restAt, unitSystem } = props;
  const { colours } = useTheme();
  const { width, measured } = useWidth(props.initialWidth);
  const places = useMemo(() => placesAlong(sections, stations), [sections, stations]);
  const stops = useMemo(() => restAt ?? places.map((place) => place.chainage), [restAt, places]);
  if (!places.length) return null;

  const x = scaleLinear(
    [places[0].chainage, places[places.length - 1].chainage],
    [INSET, Math.max(INSET, width - INSET)],
  );
  const curve = reachCurve(INSET, width - INSET, touch / 2, SWAY);
  const value = at ?? stops[0];
  const chosen = x(value);
  return (
    <View {...measured} style={styles.box}>
      <SliderSurface
        label="Place on the reach"
        stops={stops}
        value={value}
        valueText={describe(places, value, unitSystem)}
        onChange={onChange}
        onDrag={(px) => onChange(stops[nearestIndex(stops, x.invert(px))])}
        style={styles.slider}
      >
        <Svg width={width} height={touch}>
          <River path={curve.path} />
          {places.map(({ chainage, kind }) => {
            const px = x(chainage);
            const y = curve.yAt(px);
            return kind === 'station' ? (
              <Circle
                key={`s${chainage}`}
                cx={px}
                cy={y}
                r={4}
                fill={colours.card}
                stroke={colours.ink}
                strokeWidth={1.5}
              />
            ) : (
              <Line
                key={chainage}
                x1={px}
                x2={px}
                y1={y - 6}
                y2={y + 6}
                stroke={colours.soft}
                strokeWidth={1}
              />
            );
          })}
          {advice.map(({ chainage }, i) => {
            const px = x(chainage);
            const y = curve.yAt(px) - 9;
            return <Path key={i} d={`M${px},${y}l-4,-7h8z`} fill={colours.ochre} />;
          })}
          {structures.map(({ id, chainage }) => {
            const px = x(chainage);
            const y = curve.yAt(px);
            return <Path key={id} d={`M${px},${y - 9}v18`} stroke={colours.ink} strokeWidth={4} />;
          })}
          {at === null ? null : (
            <Circle
              cx={chosen}
              cy={curve.yAt(chosen)}
              r={5}
              fill={colours.card}
              stroke={colours.ink}
              strokeWidth={4.5}
            />
          )}
        </Svg>
      </SliderSurface>
    </View>
  );
}

const River = memo(function River({ path }: { path: string }) {
  const { colours } = useTheme();
  return (
    <>
      <Path
        d={path}
        stroke={colours.waterTint}
        strokeWidth={10}
        strokeLinecap="round"
        fill="none"
      />
      <Path d={path} stroke={colours.water} strokeWidth={1.75} fill="none" />
    </>
  );
});

const NONE: never[] = [];

function describe(places: readonly ReachPlace[], chainage: number, system: UnitSystem): string {
  const name = placeName(places, chainage);
  const where = formatWithUnit(chainage, 'chainage', system);
  return name ? `${name}, ${where}` : where;
}

const styles = StyleSheet.create({
  box: { alignSelf: 'stretch', height: touch },
  slider: { borderRadius: touch / 2 },
});
