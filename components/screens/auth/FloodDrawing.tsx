import { StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';

const CREST = 'M-5 84C190 84 250 14 420 14S700 70 1005 76';
const BED = 'M-5 108C120 100 190 112 310 106S520 116 640 110S860 120 1005 114';
const toFoot = (line: string) => `${line}V145H-5Z`;

/** Water as water, ground as ground: a flood wave over its bed along the foot of the page. */
export function FloodDrawing() {
  const { colours } = useTheme();
  return (
    <View style={styles.foot} aria-hidden pointerEvents="none">
      <Svg width="100%" height={140} viewBox="0 0 1000 140" preserveAspectRatio="none">
        <Path d={toFoot(CREST)} fill={colours.waterTint} />
        <Path
          d={CREST}
          fill="none"
          stroke={colours.water}
          strokeWidth={2}
          vectorEffect="non-scaling-stroke"
        />
        <Path d={toFoot(BED)} fill={colours.earthTint} />
        <Path
          d={BED}
          fill="none"
          stroke={colours.earth}
          strokeWidth={1.5}
          vectorEffect="non-scaling-stroke"
        />
      </Svg>
    </View>
  );
}

const styles = StyleSheet.create({ foot: { position: 'absolute', left: 0, right: 0, bottom: 0 } });
