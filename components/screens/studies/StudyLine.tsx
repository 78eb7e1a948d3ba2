import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import type { StudyRow } from '@/shared/studies/types';
import { space, touch } from '@/components/theme/tokens';
import { formatDay } from '@/components/ui/formatDay';
import { Txt } from '@/components/ui/Txt';

const runs = (count: number) => (count === 1 ? '1 run' : `${count} runs`);

/** Engineers see what waits for them; surveyors what became of what they sent. */
function surveyWords({ surveyStanding, runCount }: StudyRow): string | false {
  const forEngineers = runCount !== null;
  switch (surveyStanding) {
    case 'none':
      return forEngineers ? 'no survey yet' : 'nothing handed in yet';
    case 'waiting':
      return forEngineers ? 'a survey waits for you' : 'handed in, waits for an engineer';
    case 'returned':
      return 'survey returned to be mended';
    case 'accepted':
      return !forEngineers && 'survey accepted';
    default:
      return false;
  }
}

/** One study of the list: what it is, for whom, and how far it has come. */
export function StudyLine({ study }: { study: StudyRow }) {
  const what = [study.place, study.clientName && `for ${study.clientName}`]
    .filter(Boolean)
    .join(', ');
  const state = [
    study.surveyRevision !== null && `survey revision ${study.surveyRevision}`,
    surveyWords(study),
    study.runCount !== null && study.runCount > 0 && runs(study.runCount),
    formatDay(study.updatedAt),
  ].filter(Boolean);
  return (
    <Link href={`/studies/${study.id}`} asChild>
      <Pressable role="link" style={styles.line}>
        <View style={styles.names}>
          <Txt variant="lead" strong>
            {study.title}
          </Txt>
          {what ? <Txt tone="soft">{what}</Txt> : null}
        </View>
        <Txt variant="small" tone="soft">
          {state.join(' · ')}
        </Txt>
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
    alignItems: 'baseline',
    columnGap: space.three,
    rowGap: space.half,
  },
  names: { flexShrink: 1, minWidth: 0 },
});
