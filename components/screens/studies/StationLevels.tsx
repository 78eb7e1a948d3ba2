import { StyleSheet, View } from 'react-native';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { useForm } from '@/components/forms/FormRoot';
import { FormSelectField } from '@/components/forms/FormSelectField';
import { FormTextField } from '@/components/forms/FormTextField';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import { LEVEL_KINDS, type LevelKind } from '@/shared/studies/stationLevels';

/** A level as it is typed. */
export interface TypedLevel {
  kind: LevelKind;
  level: number | null;
  note: string;
}

const OPTIONS = Object.entries(LEVEL_KINDS).map(([value, label]) => ({
  value: value as LevelKind,
  label,
}));

/** The soffit, the floor, the road: what the results tell the freeboard of. */
export function StationLevels() {
  const { formik } = useForm();
  const rows = formik.values.levels as TypedLevel[];
  const set = (next: TypedLevel[]) => void formik.setFieldValue('levels', next);
  return (
    <View style={styles.all}>
      <View>
        <Txt strong>Levels</Txt>
        <Txt variant="small" tone="soft">
          What the water is held against here: results tell the freeboard, and when each is passed.
        </Txt>
      </View>
      {rows.map((_, k) => (
        <View key={k} role="group" aria-label={`Level ${k + 1}`} style={styles.one}>
          <FormSelectField<LevelKind>
            name={`levels[${k}].kind`}
            label="Level of"
            options={OPTIONS}
          />
          <FormNumberField
            name={`levels[${k}].level`}
            label="Level above datum"
            quantity="elevation"
          />
          <FormTextField
            name={`levels[${k}].note`}
            label="Which one"
            hint="For example the house and its number; may stay empty."
          />
          <Button
            kind="quiet"
            label="Remove this level"
            name={`Remove level ${k + 1}`}
            disabled={formik.isSubmitting}
            onPress={() => set(rows.filter((__, other) => other !== k))}
          />
        </View>
      ))}
      {rows.length < LIMITS.levelsPerStation ? (
        <Button
          label="Add a level"
          disabled={formik.isSubmitting}
          onPress={() => set([...rows, { kind: 'soffit', level: null, note: '' }])}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({ all: { gap: space.two }, one: { gap: space.one } });
