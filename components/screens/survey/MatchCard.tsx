import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { SelectField } from '@/components/ui/SelectField';
import { Txt } from '@/components/ui/Txt';
import type { MatchChoice, SurveyReading } from '@/shared/surveys/types';
import { MatchFields } from './MatchFields';
import { MatchTable } from './MatchTable';
import { groupSheets, isShort, passedOver, type SheetGroup } from './matchChoice';

interface MatchCardProps {
  reading: SurveyReading;
  choice: MatchChoice;
  /** While it is read again nothing can be changed. */
  busy: boolean;
  onChange: (choice: MatchChoice) => void;
}

/** How the headings were understood, each open to change; open from the start where something needed is missing. */
export function MatchCard({ reading, choice, busy, onChange }: MatchCardProps) {
  const used = groupSheets(reading.sheets);
  const others = passedOver(reading.sheets);
  const [isOpen, setOpen] = useState(() => used.some(isShort));
  return (
    <Card title="How the columns were understood" aside={busy ? 'reading again…' : undefined}>
      {used.map((group) => (
        <View key={group.key} role="group" aria-label={nameOf(group)} style={styles.group}>
          <Txt variant="small" tone="soft">
            <Txt variant="small" strong>
              {nameOf(group)}
            </Txt>
            {`: ${kindOf(group)}`}
          </Txt>
          {isOpen ? (
            <MatchFields {...{ group, choice, busy, onChange }} />
          ) : (
            <MatchTable label={nameOf(group)} {...{ group, choice }} />
          )}
        </View>
      ))}
      {isOpen ? (
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
      ) : (
        <Txt variant="small" tone="soft">
          Decimal {reading.decimal}.
        </Txt>
      )}
      {others.length > 0 ? (
        <Txt variant="small" tone="soft">
          Passed over: {others.length > 1 ? 'sheets' : 'sheet'} {others.join(', ')}.
        </Txt>
      ) : null}
      {isOpen || used.length === 0 ? null : (
        <Button label="Change the match" onPress={() => setOpen(true)} />
      )}
    </Card>
  );
}

function nameOf({ sheets }: SheetGroup): string {
  return sheets.length === 1
    ? `Sheet ${sheets[0]}`
    : `${sheets.length} sheets, ${sheets[0]} to ${sheets[sheets.length - 1]}`;
}

function kindOf({ layout, headingRow }: SheetGroup): string {
  const kind =
    layout === 'ignored'
      ? 'not recognised as a survey yet'
      : layout === 'longTable'
        ? 'one long table'
        : 'one sheet a section';
  return `${kind}, ${headingRow > 0 ? `headings in row ${headingRow}` : 'no heading row'}`;
}

const styles = StyleSheet.create({
  group: { gap: space.two },
  decimal: { maxWidth: 320 },
});
