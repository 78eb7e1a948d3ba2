import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import type { Tone } from './textStyle';
import { Txt } from './Txt';

interface FigureProps {
  /** Formatted; of a time `6 h 07` the h is set lighter. */
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
        {value.split(/( h )/).map((part, i) =>
          part === ' h ' ? (
            <Txt key={i} variant={unitSize} tone="soft">
              {part}
            </Txt>
          ) : (
            part
          ),
        )}
        {unit ? (
          <Txt variant={unitSize} tone="soft">
            {` ${unit}`}
          </Txt>
        ) : null}
      </Txt>
      <Txt variant="small" tone="soft">
        {label}
      </Txt>
    </View>
  );
}

const styles = StyleSheet.create({ figure: { gap: space.half / 2 } });
