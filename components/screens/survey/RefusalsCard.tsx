import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { downloadFaults } from '@/components/queries/surveys';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';
import type { SurveyRefusal } from '@/shared/surveys/types';
import { FaultList } from './FaultList';
import { wallClock } from '@/components/ui/wallClock';

/** Files that were not taken in: of them only the faults are kept. */
export function RefusalsCard({ refusals }: { refusals: readonly SurveyRefusal[] }) {
  if (refusals.length === 0) return null;
  return (
    <Card title="Not taken in" aside="only the faults are kept">
      {refusals.map((refusal) => (
        <Refusal key={refusal.id} refusal={refusal} />
      ))}
    </Card>
  );
}

function Refusal({ refusal }: { refusal: SurveyRefusal }) {
  const { id, fileName, faultCount, faults, sentBy, sentAt } = refusal;
  const { colours } = useTheme();
  const [open, setOpen] = useState(false);
  const download = useMutation({ mutationFn: downloadFaults });
  const notListed = Math.max(
    0,
    faultCount - faults.filter(({ severity }) => severity === 'fault').length,
  );
  return (
    <View style={[styles.refusal, { borderTopColor: colours.line }]}>
      <View>
        <Txt strong>{fileName}</Txt>
        <Txt variant="small" tone="soft">
          {faultCount === 1 ? '1 fault' : `${faultCount.toLocaleString('en-GB')} faults`} · sent by{' '}
          {sentBy} on {wallClock(sentAt)}
        </Txt>
      </View>
      <View style={styles.actions}>
        <Button
          kind="quiet"
          label={open ? 'Hide the faults' : 'Show the faults'}
          name={`${open ? 'Hide' : 'Show'} the faults of ${fileName}`}
          onPress={() => setOpen(!open)}
        />
        <Button
          kind="quiet"
          label="Faults as a spreadsheet"
          name={`Faults as a spreadsheet, of ${fileName}`}
          busy={download.isPending}
          onPress={() => download.mutate(id)}
        />
      </View>
      {download.isError ? (
        <ErrorState title="The spreadsheet was not downloaded" error={download.error} />
      ) : null}
      {open ? <FaultList label={`Faults of ${fileName}`} {...{ faults, notListed }} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  refusal: { gap: space.one, paddingTop: space.two, borderTopWidth: hairline },
  actions: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.two },
});
