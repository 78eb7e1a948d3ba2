import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import type { Tone } from './textStyle';
import { Txt } from './Txt';

interface FigureProps {
  /** Formatted; of a time `6 h 07` or `3 min 02` the unit is set lighter. */
  value: string;
  unit?: string;
  label: string;
  size?: 'title' | 'figure' | 'display';
  tone?: Tone;
}

/** A figure that matters, its unit lighter beside it and what it is below. */
export function FigureWithUnit({ value, unit, label, size = 'figure', tone }: FigureProps) {
  const unitSize = size === 'display' ? 'title' : size === 'title' ? 'small' : 'lead';
  return (
    <View style={styles.figure}>
      <Txt variant={size} strong tone={tone}>
        {value.split(/( h | min )/).map((part, i) =>
          part === ' h ' || part === ' min ' ? (
            <Txt key={i} variant={unitSize} tone="soft">
              {part.replaceAll(' ', NO_BREAK)}
            </Txt>
          ) : (
            part
          ),
        )}
        {unit ? (
          <Txt variant={unitSize} tone="soft">
            {`${NO_BREAK}${unit}`}
          </Txt>
        ) : null}
      </Txt>
      <Txt variant="small" tone="soft">
        {label}
      </Txt>
    </View>
  );
}

/** A figure and its unit stay on one line. */
const NO_BREAK = '\u00a0';

const styles = StyleSheet.create({
  figure: { gap: space.half / 2, flexShrink: 1, maxWidth: '100%' },
});
