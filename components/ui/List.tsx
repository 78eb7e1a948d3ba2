import { Children, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { hairline, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';

/** Rows between hairlines, read aloud as a list. */
export function List({ label, children }: { label: string; children: ReactNode }) {
  const { colours } = useTheme();
  return (
    <View role="list" aria-label={label}>
      {Children.toArray(children).map((child, i, all) => (
        <View
          key={i}
          role="listitem"
          style={[
            i > 0 ? styles.notFirst : null,
            i < all.length - 1 ? styles.notLast : null,
            { borderTopWidth: i > 0 ? hairline : 0, borderTopColor: colours.line },
          ]}
        >
          {child}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  notFirst: { paddingTop: space.one * 1.5 },
  notLast: { paddingBottom: space.one * 1.5 },
});
