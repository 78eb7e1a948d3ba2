import { StyleSheet, View } from 'react-native';
import Svg, { Line, Rect } from 'react-native-svg';
import { space } from '@/components/theme/tokens';
import { Txt } from '@/components/ui/Txt';

export interface KeyEntry {
  words: string;
  colour: string;
  /** A line where left out. */
  as?: 'line' | 'band';
  dash?: string;
}

const WIDTH = 28;
const HEIGHT = 12;

/** What each line or band of a drawing is. */
export function KeyList({ entries }: { entries: readonly KeyEntry[] }) {
  return (
    <View role="list" aria-label="What is drawn" style={styles.list}>
      {entries.map(({ words, colour, as = 'line', dash }) => (
        <View key={words} role="listitem" style={styles.entry}>
          <Svg width={WIDTH} height={HEIGHT} aria-hidden>
            {as === 'band' ? (
              <Rect x={0} y={0} width={WIDTH} height={HEIGHT} fill={colour} />
            ) : (
              <Line
                x1={0}
                x2={WIDTH}
                y1={HEIGHT / 2}
                y2={HEIGHT / 2}
                stroke={colour}
                strokeWidth={2}
                strokeDasharray={dash}
              />
            )}
          </Svg>
          <Txt variant="small">{words}</Txt>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two, rowGap: space.half },
  entry: { flexDirection: 'row', alignItems: 'center', gap: space.one, maxWidth: '100%' },
});
