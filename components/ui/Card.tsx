import type { ReactNode, Ref } from 'react';
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native';
import { hairline, radius, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Txt } from './Txt';

interface CardProps {
  title?: string;
  /** On the right of the title: units, place, count. */
  aside?: ReactNode;
  children?: ReactNode;
  style?: StyleProp<ViewStyle>;
  ref?: Ref<View>;
}

/** A titled piece of a screen. */
export function Card({ title, aside, children, style, ref }: CardProps) {
  const { colours } = useTheme();
  return (
    <View
      ref={ref}
      role={title ? 'region' : undefined}
      aria-label={title}
      style={[styles.card, { backgroundColor: colours.card, borderColor: colours.line }, style]}
    >
      {title || aside ? (
        <View style={styles.head}>
          {title ? (
            <Txt strong heading={2} style={styles.title}>
              {title}
            </Txt>
          ) : null}
          {typeof aside === 'string' ? (
            <Txt tone="soft">{aside}</Txt>
          ) : aside ? (
            <View style={styles.aside}>{aside}</View>
          ) : null}
        </View>
      ) : null}
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    borderWidth: hairline,
    borderRadius: radius.card,
    padding: space.two,
    gap: space.two,
    minWidth: 0,
  },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    columnGap: space.two,
  },
  title: { flexShrink: 1 },
  // A button is taller than the title; the row stays as high as in the other cards.
  aside: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: space.two,
    marginVertical: -space.one,
  },
});
