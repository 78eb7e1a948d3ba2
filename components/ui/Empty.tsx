import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { radius, space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { Txt } from './Txt';

interface EmptyProps {
  title: string;
  /** What to do about it. */
  children: ReactNode;
  action?: ReactNode;
}

/** An empty list says what to do. */
export function Empty({ title, children, action }: EmptyProps) {
  const { colours } = useTheme();
  return (
    <View style={[styles.box, { borderColor: colours.edge }]}>
      <Txt variant="lead" strong>
        {title}
      </Txt>
      {typeof children === 'string' ? <Txt tone="soft">{children}</Txt> : children}
      {action}
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    borderWidth: 1,
    borderStyle: 'dashed',
    borderRadius: radius.card,
    padding: space.three,
    gap: space.two,
  },
});
