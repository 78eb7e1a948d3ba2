import { useLocalSearchParams } from 'expo-router';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { useReview } from '@/components/queries/reviews';
import { useRun, useRunSummary } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { Run } from '@/shared/runs/types';
import { checkCrumbs } from './checkCrumbs';
import { CheckContent } from './CheckContent';

/** The checking of one run: sent, questioned, returned or signed, issued. */
export function CheckScreen() {
  const { study } = useCurrentStudy();
  const params = useLocalSearchParams<{ runId: string }>();
  const runId = Number(params.runId);
  const { data: run, error, refetch } = useRun(Number.isInteger(runId) ? runId : null);

  if (!Number.isInteger(runId) || isApiError(error, 'notFound')) return <NotThere />;
  if (run && run.studyId !== study.id) return <NotThere />;
  if (!run)
    return (
      <Screen title="Check">
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
  if (run.state !== 'routed')
    return (
      <Screen title="Check" crumbs={checkCrumbs(run)}>
        <Empty
          title="There is nothing to check yet"
          action={
            <Button label="Back to the run" href={`/studies/${run.studyId}/runs/${run.id}`} />
          }
        >
          A run is checked once its flood is routed to the end.
        </Empty>
      </Screen>
    );
  return <Routed key={run.id} run={run} />;
}

function Routed({ run }: { run: Run }) {
  const review = useReview(run.id);
  const summary = useRunSummary(run.id);
  if (review.data && summary.data)
    return <CheckContent run={run} review={review.data} summary={summary.data} />;
  const failed = review.error ? review : summary.error ? summary : null;
  return (
    <Screen title="Check" crumbs={checkCrumbs(run)}>
      {failed ? (
        <ErrorState
          error={failed.error}
          title="The check could not be read"
          retry={() => void failed.refetch()}
        />
      ) : (
        <Loading what="Reading the check…" />
      )}
    </Screen>
  );
}
