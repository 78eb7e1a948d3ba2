import { Link, type Href } from 'expo-router';
import { Fragment } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { textStyle } from '../ui/textStyle';
import { Txt } from '../ui/Txt';

export interface Crumb {
  label: string;
  href?: Href;
}

/** The way here, from the study down. */
export function Crumbs({ crumbs }: { crumbs: readonly Crumb[] }) {
  const { colours } = useTheme();
  return (
    <View role="navigation" aria-label="You are in" style={styles.row}>
      {crumbs.map(({ label, href }, i) => (
        <Fragment key={label}>
          {i > 0 ? (
            <Txt variant="small" tone="soft" aria-hidden>
              /
            </Txt>
          ) : null}
          {href ? (
            <Link href={href} style={[textStyle(colours, 'small', 'soft'), styles.link]}>
              {label}
            </Link>
          ) : (
            <Txt variant="small" tone="soft">
              {label}
            </Txt>
          )}
        </Fragment>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.half },
  link: { paddingVertical: 2 },
});
