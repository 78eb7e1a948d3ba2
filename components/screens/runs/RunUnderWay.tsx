import { StyleSheet, View } from 'react-native';
import { TimeProgress } from '@/components/charts/TimeRibbon';
import { Screen } from '@/components/layout/Screen';
import { useCancelRun } from '@/components/queries/runs';
import { useRunEvents } from '@/components/queries/useRunEvents';
import { space } from '@/components/theme/tokens';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { Run } from '@/shared/runs/types';
import { LiveWater } from './LiveWater';
import { runCrumbs } from './runCrumbs';
import { RunFacts } from './RunFacts';
import { percent, RUN_TONES, runStateWords, timeLeftWords } from './runWords';

/** A run that is queued or computing: the flood fills, the water moves, and it can be stopped. */
export function RunUnderWay({ run }: { run: Run }) {
  const { progress: event, highest, isLost } = useRunEvents(run.studyId, run.id);
  const cancel = useCancelRun(run.studyId);
  const now = event ?? { ...run, time: run.progress * run.duration, surface: null };
  const queued = now.state === 'queued';
  const words = queued
    ? 'Waiting for a free place to compute'
    : `${percent(now.progress)}, ${timeLeftWords(now.secondsLeft)}`;
  return (
    <Screen
      title={run.scenarioName}
      crumbs={runCrumbs(run)}
      badge={<Badge label={runStateWords(now)} tone={RUN_TONES[now.state]} />}
      footer={
        <TimeProgress
          inflow={run.inflow}
          end={run.duration}
          reached={now.time}
          progress={now.progress}
          valueText={words}
        />
      }
    >
      {isLost ? (
        <Notice tone="attention" title="The line to the server is broken">
          The run goes on without it. Trying to follow it again…
        </Notice>
      ) : null}
      {cancel.error ? (
        <ErrorState error={cancel.error} title="The run could not be cancelled" />
      ) : null}
      <View style={styles.head}>
        <FigureWithUnit
          value={queued ? 'Queued' : String(Math.min(99, Math.floor(now.progress * 100)))}
          unit={queued ? undefined : '%'}
          label={queued ? words : `of the flood is routed, ${timeLeftWords(now.secondsLeft)}`}
          size="display"
        />
        {run.may.includes('run.cancel') ? (
          <Button
            label="Cancel the run"
            kind="danger"
            busy={cancel.isPending}
            onPress={() => cancel.mutate(run.id)}
          />
        ) : null}
        <Spoken words={queued ? words : spokenPercent(now.progress)} />
      </View>
      <LiveWater surface={now.surface} highest={highest} time={now.time} span={run.duration} />
      <RunFacts run={run} />
    </Screen>
  );
}

/** Told to a screen reader by tens, so that it is not talked over. */
const spokenPercent = (share: number) => `${Math.floor(share * 10) * 10} % routed`;

function Spoken({ words }: { words: string }) {
  return (
    <Txt aria-live="polite" style={styles.hidden}>
      {words}
    </Txt>
  );
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.two,
    justifyContent: 'space-between',
    alignItems: 'flex-end',
  },
  hidden: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 },
});
