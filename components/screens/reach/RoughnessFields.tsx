import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { useForm } from '@/components/forms/FormRoot';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Txt } from '@/components/ui/Txt';
import { RoughnessTable } from './RoughnessTable';
import type { SectionsFormValues } from './sectionsForm';

type Zones = NonNullable<SectionsFormValues['zones']>;

const STRIPS = [
  { value: 'left', label: 'Left of the banks' },
  { value: 'channel', label: 'Channel' },
  { value: 'right', label: 'Right of the banks' },
] as const;

/** Manning's n by strip or by offset, with the published table beside it. */
export function RoughnessFields({ roughness }: { roughness: 'byBank' | 'byOffset' }) {
  const { formik, errorOf } = useForm();
  const zones = formik.values.zones as Zones;
  const targets =
    roughness === 'byBank'
      ? STRIPS
      : zones.map((_, index) => ({ value: `zones[${index}].n`, label: `Zone ${index + 1}` }));
  const [chosen, setChosen] = useState<string>('channel');
  const target = targets.find(({ value }) => value === chosen)?.value ?? targets[0]?.value ?? null;
  const setZones = (next: Zones) => void formik.setFieldValue('zones', next);
  const zonesError = errorOf('zones');

  return (
    <View style={styles.fields}>
      {roughness === 'byBank'
        ? STRIPS.map(({ value, label }) => (
            <FormNumberField key={value} name={value} label={label} unit="Manning's n" />
          ))
        : zones.map((_, index) => (
            <View key={index} style={styles.zone}>
              <View style={styles.grow}>
                <FormNumberField
                  name={`zones[${index}].from`}
                  label={`Zone ${index + 1} from offset`}
                  quantity="length"
                />
              </View>
              <View style={styles.grow}>
                <FormNumberField
                  name={`zones[${index}].n`}
                  label={`Zone ${index + 1}`}
                  unit="Manning's n"
                />
              </View>
              <Button
                kind="quiet"
                label="Remove"
                name={`Remove zone ${index + 1}`}
                disabled={zones.length === 1}
                onPress={() => setZones(zones.filter((_, at) => at !== index))}
              />
            </View>
          ))}
      {roughness === 'byOffset' ? (
        <Button
          label="Add a zone to the right"
          onPress={() => setZones([...zones, { from: null, n: null }])}
        />
      ) : null}
      {zonesError ? (
        <Txt role="alert" variant="small" tone="brick" strong>
          {zonesError}
        </Txt>
      ) : null}
      <RoughnessTable
        targets={targets}
        target={target}
        onTarget={setChosen}
        onTake={(n) => {
          if (target) void formik.setFieldValue(target, n);
        }}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: space.two },
  zone: { flexDirection: 'row', flexWrap: 'wrap', gap: space.one, alignItems: 'flex-start' },
  grow: { flexGrow: 1, flexBasis: 110, minWidth: 0 },
});
