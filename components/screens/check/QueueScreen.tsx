import { Link } from 'expo-router';
import { useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCheckQueue } from '@/components/queries/reviews';
import { useMe } from '@/components/queries/SessionProvider';
import { space, touch } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Card } from '@/components/ui/Card';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { List } from '@/components/ui/List';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import type { QueueRow } from '@/shared/review/types';
import { wallClock } from '@/components/ui/wallClock';
import { ageWords } from './reviewWords';

/** Runs that wait for this senior engineer, oldest first. */
export function QueueScreen() {
  const me = useMe();
  const mayCheck = me.roles.includes('seniorEngineer');
  const { data: rows, error, refetch } = useCheckQueue(mayCheck);
  const [now] = useState(Date.now);
  if (!mayCheck) return <NotThere />;
  return (
    <Screen
      title="To check"
      crumbs={[{ label: me.firm.name }]}
      lead={rows?.length ? 'Runs that wait for a senior engineer, oldest first.' : undefined}
    >
      {error && !rows ? (
        <ErrorState
          error={error}
          title="The queue could not be read"
          retry={() => void refetch()}
        />
      ) : null}
      {!rows && !error ? <Loading what="Reading what waits for a check…" /> : null}
      {rows?.length === 0 ? (
        <Empty title="Nothing waits for you">
          When a modeller sends a run for checking it stands here, and you are told by e-mail. Runs
          that you asked for yourself go to somebody else.
        </Empty>
      ) : null}
      {rows?.length ? (
        <Card>
          <List label="Runs to check">
            {rows.map((row) => (
              <QueueLine key={row.runId} row={row} now={now} />
            ))}
          </List>
        </Card>
      ) : null}
    </Screen>
  );
}

function QueueLine({ row, now }: { row: QueueRow; now: number }) {
  const { studyId, runId, runNumber, scenarioName, studyTitle, sentBy, sentAt, openPoints } = row;
  const points = openPoints === 1 ? '1 point not closed' : `${openPoints} points not closed`;
  return (
    <Link href={`/studies/${studyId}/runs/${runId}/check`} asChild>
      <Pressable role="link" style={styles.line}>
        <View style={styles.names}>
          <Txt variant="lead" strong>{`Run ${runNumber}, ${scenarioName}`}</Txt>
          <Txt tone="soft">{studyTitle}</Txt>
          <Txt variant="small" tone="soft">
            {`Sent by ${sentBy}, ${wallClock(sentAt)}`}
          </Txt>
        </View>
        <View style={styles.state}>
          <Txt strong>{`waits ${ageWords(sentAt, now)}`}</Txt>
          {openPoints ? <Badge label={points} tone="ochre" /> : null}
          {row.mine ? <Badge label="Sent to you" tone="earth" /> : null}
        </View>
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  line: {
    minHeight: touch,
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    gap: space.one,
  },
  names: { flexGrow: 1, flexShrink: 1, flexBasis: 240, minWidth: 0 },
  state: { gap: space.half },
});
