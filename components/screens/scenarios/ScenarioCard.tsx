import { router } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useRemoveScenario } from '@/components/queries/scenarios';
import { space } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Dialog } from '@/components/ui/Dialog';
import { ErrorState } from '@/components/ui/ErrorState';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ScenarioRow } from '@/shared/scenarios/types';
import { formatWithUnit } from '@/shared/units/format';
import { keptDraft } from './draftStore';
import { DuplicateDialog } from './DuplicateDialog';

interface ScenarioCardProps {
  row: ScenarioRow;
  reachName: string;
}

/** One scenario of the list, with what can be done to it. */
export function ScenarioCard({ row, reachName }: ScenarioCardProps) {
  const { study, may } = useCurrentStudy();
  const system = useUnitSystem();
  const remove = useRemoveScenario(study.id);
  const [asking, setAsking] = useState<'remove' | 'duplicate' | null>(null);
  const { id, name, faultCount, runCount, peakInflow } = row;
  const facts = [
    peakInflow === null ? 'no inflow yet' : `peak ${formatWithUnit(peakInflow, 'flow', system)}`,
    reachName,
    runCount === 0 ? 'not routed yet' : runCount === 1 ? '1 run' : `${runCount} runs`,
  ];
  return (
    <Card title={name} aside={<State faultCount={faultCount} isKept={keptDraft(id) !== null} />}>
      <Txt tone="soft">{facts.filter(Boolean).join(' · ')}</Txt>
      <Txt variant="small" tone="soft">
        Changed by {row.updatedBy} on {changedOn(row.updatedAt)}
      </Txt>
      <View style={styles.buttons}>
        <Button label="Open" name={`Open ${name}`} href={`/studies/${study.id}/scenarios/${id}`} />
        {may('scenario.change') ? (
          <>
            <Button
              kind="quiet"
              label="Duplicate"
              name={`Duplicate ${name}`}
              onPress={() => setAsking('duplicate')}
            />
            {runCount === 0 ? (
              <Button
                kind="quiet"
                label="Remove"
                name={`Remove ${name}`}
                onPress={() => setAsking('remove')}
              />
            ) : null}
          </>
        ) : null}
      </View>
      {remove.isError ? (
        <ErrorState title={`${name} was not removed`} error={remove.error} />
      ) : null}
      {asking === 'duplicate' ? (
        <DuplicateDialog
          row={row}
          onClose={() => setAsking(null)}
          onMade={(copyId, part) =>
            router.push({
              pathname: '/studies/[studyId]/scenarios/[scenarioId]',
              params: { studyId: study.id, scenarioId: copyId, ...(part && { part }) },
            })
          }
        />
      ) : null}
      <Dialog
        title={`Remove ${name}?`}
        open={asking === 'remove'}
        onClose={() => setAsking(null)}
        actions={
          <>
            <Button
              label="Remove it"
              kind="danger"
              onPress={() => {
                setAsking(null);
                remove.mutate(id);
              }}
            />
            <Button label="Keep it" onPress={() => setAsking(null)} />
          </>
        }
      >
        <Txt>Its settings and its inflow are gone for good. It has no runs.</Txt>
      </Dialog>
    </Card>
  );
}

function State({ faultCount, isKept }: { faultCount: number; isKept: boolean }) {
  if (isKept) return <Badge label="Not saved" tone="ochre" />;
  if (faultCount === 0) return <Badge label="Ready to route" tone="moss" />;
  return <Badge label={`Draft, ${faultCount} to mend`} />;
}

const changedOn = (iso: string): string =>
  new Date(iso).toLocaleDateString('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

const styles = StyleSheet.create({
  buttons: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    columnGap: space.two,
    rowGap: space.one,
    alignItems: 'center',
  },
});
