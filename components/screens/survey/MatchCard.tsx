import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Card } from '@/components/ui/Card';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import {
  LENGTH_UNITS,
  SURVEY_FIELDS,
  type LengthUnit,
  type MatchChoice,
  type SurveyField,
  type SurveyReading,
} from '@/shared/surveys/types';
import {
  chooseField,
  chooseUnit,
  FIELD_NAMES,
  groupSheets,
  isLength,
  UNIT_NAMES,
  type SheetGroup,
} from './matchChoice';

interface MatchCardProps {
  reading: SurveyReading;
  choice: MatchChoice;
  /** While it is read again nothing can be changed. */
  busy: boolean;
  onChange: (choice: MatchChoice) => void;
}

/** How the headings were understood, each open to change. */
export function MatchCard({ reading, choice, busy, onChange }: MatchCardProps) {
  const groups = groupSheets(reading.sheets);
  const used = groups.filter(({ layout }) => layout !== 'ignored');
  const ignored = groups.filter(({ layout }) => layout === 'ignored');
  return (
    <Card title="How the columns were understood" aside={busy ? 'reading again…' : undefined}>
      {used.map((group) => (
        <Group key={group.key} {...{ group, choice, busy, onChange }} />
      ))}
      <View style={styles.decimal}>
        <SelectField
          label="Decimal sign"
          value={choice.decimal}
          disabled={busy}
          options={[
            { value: 'auto', label: `As found: ${reading.decimal}` },
            { value: 'point', label: 'Point, 38.40' },
            { value: 'comma', label: 'Comma, 38,40' },
          ]}
          onChange={(decimal) => onChange({ ...choice, decimal })}
        />
      </View>
      {ignored.map(({ key, sheets }) => (
        <Txt key={key} variant="small" tone="soft">
          Passed over: {sheets.length > 1 ? 'sheets' : 'sheet'} {sheets.join(', ')}.
        </Txt>
      ))}
    </Card>
  );
}

interface GroupProps {
  group: SheetGroup;
  choice: MatchChoice;
  busy: boolean;
  onChange: (choice: MatchChoice) => void;
}

function Group({ group, choice, busy, onChange }: GroupProps) {
  const { sheets, layout, headingRow, columns } = group;
  const name =
    sheets.length === 1
      ? `Sheet ${sheets[0]}`
      : `${sheets.length} sheets, ${sheets[0]} to ${sheets[sheets.length - 1]}`;
  const kind = layout === 'longTable' ? 'one long table' : 'one sheet a section';
  const row = headingRow > 0 ? `headings in row ${headingRow}` : 'no heading row';
  return (
    <View role="group" aria-label={name} style={styles.group}>
      <Txt variant="small" tone="soft">
        <Txt variant="small" strong>
          {name}
        </Txt>
        {`: ${kind}, ${row}`}
      </Txt>
      {columns.map(({ column, heading, sample }) => {
        const entry = choice.columns.find((one) => one.column === column);
        const title = heading || `Column ${column + 1}`;
        return (
          <View key={column} style={styles.column}>
            <View style={styles.heading}>
              <Txt strong>{title}</Txt>
              <Txt variant="small" tone="soft" numberOfLines={1}>
                {sample.length > 0 ? sample.slice(0, 4).join(' · ') : 'empty'}
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
      })}
    </View>
  );
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
  group: { gap: space.two },
  column: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two, rowGap: space.half },
  heading: { flexBasis: 180, flexGrow: 1, minWidth: 0 },
  meaning: { flexBasis: 150, flexGrow: 1 },
  unit: { flexBasis: 130, flexGrow: 1 },
  decimal: { maxWidth: 320 },
});
