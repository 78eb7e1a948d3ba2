import { router } from 'expo-router';
import { Screen } from '@/components/layout/Screen';
import { useRetryRun } from '@/components/queries/runs';
import { Badge } from '@/components/ui/Badge';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { Run } from '@/shared/runs/types';
import { runCrumbs } from './runCrumbs';
import { RunFacts } from './RunFacts';
import { RUN_TONES, runStateWords } from './runWords';

/** A run that was cancelled or stopped with a fault: why, and what to do next. */
export function StoppedRun({ run }: { run: Run }) {
  const retry = useRetryRun(run.studyId);
  const again = () =>
    retry.mutate(run.id, {
      onSuccess: (next) => {
        if (next.id !== run.id) router.replace(`/studies/${run.studyId}/runs/${next.id}`);
      },
    });
  const failed = run.state === 'failed';
  return (
    <Screen
      title={run.scenarioName}
      crumbs={runCrumbs(run)}
      badge={<Badge label={runStateWords(run)} tone={RUN_TONES[run.state]} />}
      actions={
        <>
          <Button
            label="Open the scenario"
            href={`/studies/${run.studyId}/scenarios/${run.scenarioId}`}
          />
          {run.may.includes('run.retry') ? (
            <Button label="Try again" kind="solid" busy={retry.isPending} onPress={again} />
          ) : null}
        </>
      }
    >
      <Notice
        tone={failed ? 'danger' : 'info'}
        title={failed ? 'The run stopped before its end' : 'The run was cancelled'}
        still
      >
        <Txt>
          {failed
            ? (run.failure ??
              'No reason was given. Try it again; if it stops again, look at the scenario.')
            : 'Nothing of it was kept but its inputs. Trying again routes the same flood from the start.'}
        </Txt>
      </Notice>
      {retry.error ? (
        <ErrorState error={retry.error} title="The run could not be asked for again" />
      ) : null}
      <RunFacts run={run} />
    </Screen>
  );
}
