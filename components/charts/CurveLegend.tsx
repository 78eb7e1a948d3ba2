import { StyleSheet, View } from 'react-native';
import Svg, { Line } from 'react-native-svg';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Txt } from '@/components/ui/Txt';
import { formatNumber, formatWithUnit } from '@/shared/units/format';
import { lookOf } from './curveLooks';
import { CurveMark } from './CurveMark';
import type { CurveSetInput, SetCurve } from './geometry/curveSetModel';
import { nearestIndex, valueAt } from './geometry/interpolate';

type Props = Pick<CurveSetInput, 'curves' | 'value' | 'unitSystem'> & { at: number | null };

/** Each curve as it is drawn, its name, and its value at the cursor. */
export function CurveLegend({ curves, value, unitSystem, at }: Props) {
  const show = (v: number) =>
    value === 'number' ? formatNumber(v, 3) : formatWithUnit(v, value, unitSystem);
  return (
    <View role="list" aria-label="Curves" style={styles.list}>
      {curves.map((curve) => {
        const v = at === null ? null : valueOf(curve, at);
        return (
          <View key={curve.name} role="listitem" style={styles.item}>
            <Swatch look={curve.look} dots={curve.dots} />
            <Txt variant="small">
              {curve.name}
              {v === null || !Number.isFinite(v) ? null : (
                <Txt variant="small" strong>{` ${show(v)}`}</Txt>
              )}
            </Txt>
          </View>
        );
      })}
    </View>
  );
}

/** Lines between their points, points where the cursor stands at one; null beyond both ends. */
function valueOf({ x, y, dots }: SetCurve, at: number): number | null {
  const last = x.length - 1;
  if (last < 0 || at < x[0] || at > x[last]) return null;
  if (!dots) return valueAt(x, y, at);
  const i = nearestIndex(x, at);
  return Math.abs(x[i] - at) < 0.01 * (x[last] - x[0]) ? y[i] : null;
}

function Swatch({ look, dots }: { look: number; dots?: boolean }) {
  const { colours } = useTheme();
  const { colour, dash, width } = lookOf(look);
  return (
    <Svg width={36} height={14} aria-hidden>
      {dots ? null : (
        <Line
          x1={0}
          x2={36}
          y1={7}
          y2={7}
          stroke={colours[colour]}
          strokeWidth={width}
          strokeDasharray={dash}
        />
      )}
      <CurveMark x={18} y={7} look={look} />
    </Svg>
  );
}

const styles = StyleSheet.create({
  list: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two, rowGap: space.half },
  item: { flexDirection: 'row', alignItems: 'center', gap: space.one, maxWidth: '100%' },
});
