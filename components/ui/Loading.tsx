import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Spinner } from './Spinner';
import { Txt } from './Txt';

/** Says what is being waited for, e.g. "Reading the survey…". */
export function Loading({ what }: { what: string }) {
  const { colours } = useTheme();
  return (
    <View role="status" style={styles.box}>
      <Spinner colour={colours.soft} />
      <Txt tone="soft">{what}</Txt>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { flexDirection: 'row', gap: space.one, alignItems: 'center', paddingVertical: space.three },
});
