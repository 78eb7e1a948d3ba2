import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import {
  LENGTH_UNITS,
  SURVEY_FIELDS,
  type LengthUnit,
  type MatchChoice,
  type SurveyField,
} from '@/shared/surveys/types';
import {
  chooseField,
  chooseUnit,
  FIELD_NAMES,
  headingOf,
  isLength,
  UNIT_NAMES,
  type SheetGroup,
} from './matchChoice';

interface MatchFieldsProps {
  group: SheetGroup;
  choice: MatchChoice;
  busy: boolean;
  onChange: (choice: MatchChoice) => void;
}

/** The meaning and the unit of each column, to choose. */
export function MatchFields({ group, choice, busy, onChange }: MatchFieldsProps) {
  return group.columns.map((match) => {
    const { column, sample } = match;
    const entry = choice.columns.find((one) => one.column === column);
    const title = headingOf(match);
    return (
      <View key={column} style={styles.column}>
        <View style={styles.heading}>
          <Txt strong>{title}</Txt>
          <Txt variant="small" tone="soft" numberOfLines={1}>
            {sample.slice(0, 4).join(' · ') || 'empty'}
          </Txt>
        </View>
        <View style={styles.meaning}>
          <SelectField
            label={`${title} means`}
            value={entry?.field ?? PASSED_OVER}
            disabled={busy}
            options={FIELD_OPTIONS}
            onChange={(field) =>
              onChange(chooseField(choice, column, field === PASSED_OVER ? null : field))
            }
          />
        </View>
        <View style={styles.unit}>
          {isLength(entry?.field ?? null) ? (
            <SelectField
              label="in"
              value={entry?.unit ?? null}
              disabled={busy}
              options={UNIT_OPTIONS}
              onChange={(unit) => onChange(chooseUnit(choice, column, unit))}
            />
          ) : null}
        </View>
      </View>
    );
  });
}

const PASSED_OVER = 'passedOver';
const FIELD_OPTIONS: { value: SurveyField | typeof PASSED_OVER; label: string }[] = [
  { value: PASSED_OVER, label: 'Passed over' },
  ...SURVEY_FIELDS.map((value) => ({ value, label: FIELD_NAMES[value] })),
];
const UNIT_OPTIONS: { value: LengthUnit; label: string }[] = LENGTH_UNITS.map((value) => ({
  value,
  label: UNIT_NAMES[value],
}));

const styles = StyleSheet.create({
  column: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two, rowGap: space.half },
  heading: { flexBasis: 180, flexGrow: 1, minWidth: 0 },
  meaning: { flexBasis: 150, flexGrow: 1 },
  unit: { flexBasis: 130, flexGrow: 1 },
});
