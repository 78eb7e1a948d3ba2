import { StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';

const WAVE = 'M0 84C190 84 250 14 420 14S700 70 1000 76V110H0Z';
const CREST = 'M0 84C190 84 250 14 420 14S700 70 1000 76';
const BED = 'M0 108C120 100 190 112 310 106S520 116 640 110S860 120 1000 114V140H0Z';

/** Water as water, ground as ground: a flood wave over its bed along the foot of the page. */
export function FloodDrawing() {
  const { colours } = useTheme();
  return (
    <View style={styles.foot} aria-hidden pointerEvents="none">
      <Svg width="100%" height={140} viewBox="0 0 1000 140" preserveAspectRatio="none">
        <Path d={WAVE} fill={colours.waterTint} />
        <Path
          d={CREST}
          fill="none"
          stroke={colours.water}
          strokeWidth={2}
          vectorEffect="non-scaling-stroke"
        />
        <Path
          d={BED}
          fill={colours.earthTint}
          stroke={colours.earth}
          strokeWidth={1.5}
          vectorEffect="non-scaling-stroke"
        />
      </Svg>
    </View>
  );
}

const styles = StyleSheet.create({ foot: { position: 'absolute', left: 0, right: 0, bottom: 0 } });
