import { StyleSheet, View } from 'react-native';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormSelectField } from '@/components/forms/FormSelectField';
import { FormTextField } from '@/components/forms/FormTextField';
import { useFormField } from '@/components/forms/useFormField';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import type { SearchStretch } from '@/shared/calibration/search/types';
import { hasRoom, nextStretch } from './searchForm';
import { PART_WORDS } from './stretchWords';

interface Props {
  sections: readonly { chainage: number }[];
}

/** The multipliers that are sought: a stretch, a part of its sections, and bounds each. */
export function StretchFields({ sections }: Props) {
  const { value: stretches, onChange, error } = useFormField<SearchStretch[]>('stretches');
  const { colours } = useTheme();
  return (
    <Card title="Multipliers" aside={`${stretches.length}`}>
      <Txt variant="small" tone="soft">
        Each multiplies Manning’s n between two chainages. Few observations tell few multipliers:
        one or two are often all that they can.
      </Txt>
      {stretches.map((stretch, i) => (
        <View
          key={i}
          role="group"
          aria-label={stretch.name || `Multiplier ${i + 1}`}
          style={[styles.stretch, { borderTopColor: colours.line }]}
        >
          <FormTextField name={`stretches[${i}].name`} label="Name" optional maxLength={120} />
          <FormSelectField
            name={`stretches[${i}].part`}
            label="Part of the section"
            options={Object.entries(PART_WORDS).map(([value, label]) => ({ value, label }))}
          />
          <View style={styles.pair}>
            <View style={styles.half}>
              <FormNumberField name={`stretches[${i}].from`} label="From" quantity="chainage" />
            </View>
            <View style={styles.half}>
              <FormNumberField name={`stretches[${i}].to`} label="To" quantity="chainage" />
            </View>
          </View>
          <View style={styles.pair}>
            <View style={styles.half}>
              <FormNumberField name={`stretches[${i}].low`} label="Not below" unit="× n" />
            </View>
            <View style={styles.half}>
              <FormNumberField name={`stretches[${i}].high`} label="Not above" unit="× n" />
            </View>
          </View>
          {stretches.length > 1 ? (
            <Button
              kind="danger"
              label="Remove"
              name={`Remove ${stretch.name || `multiplier ${i + 1}`}`}
              onPress={() => onChange(stretches.filter((_, k) => k !== i))}
            />
          ) : null}
        </View>
      ))}
      {error ? (
        <Txt role="alert" variant="small" tone="brick" strong>
          {error}
        </Txt>
      ) : null}
      {hasRoom(stretches.length) ? (
        <Button
          label="Add a multiplier"
          onPress={() => onChange([...stretches, nextStretch(sections)])}
        />
      ) : null}
    </Card>
  );
}

const styles = StyleSheet.create({
  stretch: { gap: space.two, paddingTop: space.two, borderTopWidth: hairline },
  pair: { flexDirection: 'row', gap: space.two },
  half: { flex: 1, minWidth: 0 },
});
