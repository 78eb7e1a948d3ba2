import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import { KIND_WORDS } from '@/components/queries/tasks';
import { space } from '@/components/theme/tokens';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Badge } from '@/components/ui/Badge';
import { Card } from '@/components/ui/Card';
import { List } from '@/components/ui/List';
import { Txt } from '@/components/ui/Txt';
import { wallClock } from '@/components/ui/wallClock';
import type { TaskSetRow } from '@/shared/tasks/types';
import { timeLeftWords } from '../runs/runWords';
import { setBadge } from './confidenceWords';

/** Sets of the study, newest first. */
export function SetsCard({ sets, studyId }: { sets: readonly TaskSetRow[]; studyId: number }) {
  return (
    <Card title="Computed sets">
      <List label="Computed sets">
        {sets.map((set) => (
          <SetLine key={set.id} set={set} studyId={studyId} />
        ))}
      </List>
    </Card>
  );
}

function SetLine({ set, studyId }: { set: TaskSetRow; studyId: number }) {
  const { isWide } = useBreakpoint();
  const done = `${set.finished + set.failed} of ${set.total} members`;
  return (
    <Link href={`/studies/${studyId}/confidence/${set.id}`} asChild>
      <Pressable role="link" style={isWide ? styles.wide : styles.phone}>
        <View style={styles.name}>
          <Txt strong>{set.name}</Txt>
          <Txt variant="small" tone="soft">
            {`${KIND_WORDS[set.kind]}, asked for by ${set.requestedBy}, ${wallClock(set.requestedAt)}`}
          </Txt>
        </View>
        <Txt variant="small" tone="soft">
          {set.state === 'running' ? `${done}, ${timeLeftWords(set.secondsLeft)}` : done}
        </Txt>
        <View>
          <Badge {...setBadge(set)} />
        </View>
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  wide: { flexDirection: 'row', alignItems: 'center', gap: space.two },
  phone: { gap: space.half },
  name: { flexGrow: 1, flexShrink: 1, minWidth: 0 },
});
