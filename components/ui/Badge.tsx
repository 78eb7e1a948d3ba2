import { StyleSheet, View } from 'react-native';
import { radius, space, type Colours } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Txt } from './Txt';

export type BadgeTone = 'soft' | 'ochre' | 'brick' | 'moss' | 'earth';

const GROUND: Record<BadgeTone, keyof Colours> = {
  soft: 'line',
  ochre: 'ochreTint',
  brick: 'brickTint',
  moss: 'mossTint',
  earth: 'earthTint',
};

/** A state in one or two words. */
export function Badge({ label, tone = 'soft' }: { label: string; tone?: BadgeTone }) {
  const { colours } = useTheme();
  return (
    <View style={[styles.badge, { backgroundColor: colours[GROUND[tone]] }]}>
      <Txt variant="small" strong tone={tone === 'soft' ? 'ink' : tone}>
        {label}
      </Txt>
    </View>
  );
}

const styles = StyleSheet.create({
  badge: {
    alignSelf: 'flex-start',
    paddingHorizontal: space.one,
    paddingVertical: 2,
    borderRadius: radius.small,
  },
});
