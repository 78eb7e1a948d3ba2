import { StyleSheet, View } from 'react-native';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { space } from '@/components/theme/tokens';
import { Txt } from '@/components/ui/Txt';

/** Offsets of the bank marks. */
export function BankFields({ several }: { several: boolean }) {
  return (
    <View style={styles.fields}>
      <View style={styles.pair}>
        <View style={styles.half}>
          <FormNumberField name="leftBank" label="Left bank, offset" quantity="length" />
        </View>
        <View style={styles.half}>
          <FormNumberField name="rightBank" label="Right bank, offset" quantity="length" />
        </View>
      </View>
      {several ? (
        <Txt variant="small" tone="ochre">
          The same offsets go to every section chosen.
        </Txt>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: space.one },
  pair: { flexDirection: 'row', gap: space.two },
  half: { flex: 1, minWidth: 0 },
});
