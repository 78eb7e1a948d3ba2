import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Txt } from '@/components/ui/Txt';

export interface Fact {
  name: string;
  value: string;
}

/** Names with their values, one a line. */
export function Facts({ facts }: { facts: readonly Fact[] }) {
  return (
    <View style={styles.list}>
      {facts.map(({ name, value }) => (
        <View key={name} style={styles.row}>
          <Txt variant="small" tone="soft" style={styles.name}>
            {name}
          </Txt>
          <Txt variant="small" style={styles.value}>
            {value}
          </Txt>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space.half },
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two },
  name: { width: 132 },
  value: { flexGrow: 1, flexShrink: 1, flexBasis: 150, overflowWrap: 'anywhere' } as object,
});
