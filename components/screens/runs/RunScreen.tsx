import { useLocalSearchParams } from 'expo-router';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { isUnfinished, useRun } from '@/components/queries/runs';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { RunResults } from './results/RunResults';
import { RunUnderWay } from './RunUnderWay';
import { StoppedRun } from './StoppedRun';

/** One run: while it computes, where it stopped, or what came out. */
export function RunScreen() {
  const { study } = useCurrentStudy();
  const params = useLocalSearchParams<{ runId: string }>();
  const runId = Number(params.runId);
  const { data: run, error, refetch } = useRun(Number.isInteger(runId) ? runId : null);

  if (!Number.isInteger(runId) || isApiError(error, 'notFound')) return <NotThere />;
  if (run && run.studyId !== study.id) return <NotThere />;
  if (!run)
    return (
      <Screen title="Run">
        {error ? (
          <ErrorState
            error={error}
            title="The run could not be read"
            retry={() => void refetch()}
          />
        ) : (
          <Loading what="Reading the run…" />
        )}
      </Screen>
    );
  if (isUnfinished(run)) return <RunUnderWay key={run.id} run={run} />;
  return run.state === 'routed' ? (
    <RunResults key={run.id} run={run} />
  ) : (
    <StoppedRun key={run.id} run={run} />
  );
}
