import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { NumberField } from '@/components/ui/NumberField';

interface Stretch {
  /** m; null while empty. */
  from: number | null;
  to: number | null;
}

/** Where a stretch of the reach begins and ends. */
export function FromToFields<S extends Stretch>({
  stretch,
  onChange,
}: {
  stretch: S;
  onChange: (stretch: S) => void;
}) {
  return (
    <View style={styles.pair}>
      <View style={styles.half}>
        <NumberField
          label="From chainage"
          quantity="chainage"
          value={stretch.from}
          onChange={(from) => onChange({ ...stretch, from })}
        />
      </View>
      <View style={styles.half}>
        <NumberField
          label="To chainage"
          quantity="chainage"
          value={stretch.to}
          onChange={(to) => onChange({ ...stretch, to })}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  pair: { flexDirection: 'row', gap: space.two },
  half: { flex: 1, minWidth: 0 },
});
