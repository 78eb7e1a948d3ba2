import { StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { fonts, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Txt } from '../ui/Txt';

/** A flood wave over its bed, and the name. */
export function Wordmark() {
  const { colours } = useTheme();
  return (
    <View style={styles.row}>
      <Svg width={24} height={24} viewBox="0 0 24 24" aria-hidden>
        <Path
          d="M2 14.5C6 14.5 6 5.5 11 5.5s6 9 11 9"
          fill="none"
          stroke={colours.water}
          strokeWidth={2.6}
          strokeLinecap="round"
        />
        <Path d="M2 20H22" stroke={colours.earth} strokeWidth={2.6} strokeLinecap="round" />
      </Svg>
      <Txt variant="title" style={{ fontFamily: `${fonts.bold}, system-ui, sans-serif` }}>
        Spate
      </Txt>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space.one, alignItems: 'center' },
});
