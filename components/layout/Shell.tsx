import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { PhoneNav } from './PhoneNav';
import { Rail } from './Rail';

/** Around the signed-in screens: the rail beside them, or the places below. */
export function Shell({ children }: { children: ReactNode }) {
  const { isWide } = useBreakpoint();
  const { colours } = useTheme();
  return (
    <View style={[isWide ? styles.wide : styles.phone, { backgroundColor: colours.paper }]}>
      {isWide ? <Rail /> : null}
      <View style={styles.work}>{children}</View>
      {isWide ? null : <PhoneNav />}
    </View>
  );
}

const styles = StyleSheet.create({
  wide: { flex: 1, flexDirection: 'row' },
  phone: { flex: 1 },
  work: { flex: 1, minWidth: 0, minHeight: 0 },
});
