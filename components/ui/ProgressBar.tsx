import { StyleSheet, View } from 'react-native';
import { radius, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';

/** How far something has come, 0..1, with its words for who does not see it. */
export function ProgressBar({
  label,
  share,
  words,
}: {
  label: string;
  share: number;
  words?: string;
}) {
  const { colours } = useTheme();
  const percent = Math.floor(100 * Math.min(1, Math.max(0, share)));
  return (
    <View
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={100}
      aria-valuenow={percent}
      aria-valuetext={words}
      style={[styles.trough, { backgroundColor: colours.earthTint }]}
    >
      <View style={[styles.done, { width: `${percent}%`, backgroundColor: colours.ink }]} />
    </View>
  );
}

const styles = StyleSheet.create({
  trough: { height: space.one, borderRadius: radius.small, overflow: 'hidden' },
  done: { height: '100%' },
});
