import { Children, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';

/** Short fields side by side where there is room. */
export function FieldRow({ children }: { children: ReactNode }) {
  return (
    <View style={styles.row}>
      {Children.map(children, (child) => (
        <View style={styles.field}>{child}</View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: space.two, paddingLeft: 28 },
  field: { flexGrow: 1, flexBasis: 120, maxWidth: 220, minWidth: 0 },
});
