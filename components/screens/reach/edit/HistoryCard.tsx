import { View } from 'react-native';
import { useReachChanges } from '@/components/queries/geometries';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { List } from '@/components/ui/List';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { wallClock } from '@/components/ui/wallClock';

const STEPS = 6;

/** Who did what to the geometry when, newest first. */
export function HistoryCard({ reachId }: { reachId: number }) {
  const changes = useReachChanges(reachId);
  return (
    <Card title="History">
      {changes.isPending ? <Loading what="Reading the history…" /> : null}
      {changes.isError ? (
        <ErrorState
          title="The history could not be read"
          error={changes.error}
          retry={() => void changes.refetch()}
        />
      ) : null}
      {changes.data?.length === 0 ? (
        <Txt tone="soft">Nothing has been changed since it was surveyed.</Txt>
      ) : null}
      {changes.data && changes.data.length > 0 ? (
        <List label="Changes">
          {changes.data.map(({ version, words, steps, changedBy, changedAt }, i) => (
            <View key={`${version} ${i}`}>
              <Txt>{words}</Txt>
              {steps.slice(0, STEPS).map((step, at) => (
                <Txt key={at} variant="small" tone="soft">
                  {step}
                </Txt>
              ))}
              {steps.length > STEPS ? (
                <Txt variant="small" tone="soft">
                  and {steps.length - STEPS} steps more
                </Txt>
              ) : null}
              <Txt variant="small" tone="soft">
                Version {version}, {changedBy}, {wallClock(changedAt)}
              </Txt>
            </View>
          ))}
        </List>
      ) : null}
    </Card>
  );
}
