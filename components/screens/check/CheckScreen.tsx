import { Screen } from '@/components/layout/Screen';
import { useReview } from '@/components/queries/reviews';
import { useRunSummary } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { Run } from '@/shared/runs/types';
import { RunGate } from '../runs/RunGate';
import { checkCrumbs } from './checkCrumbs';
import { CheckContent } from './CheckContent';

/** The checking of one run: sent, questioned, returned or signed, issued. */
export const CheckScreen = () => <RunGate title="Check">{show}</RunGate>;

function show(run: Run) {
  if (run.state === 'routed') return <Routed key={run.id} run={run} />;
  return (
    <Screen title="Check" crumbs={checkCrumbs(run)}>
      <Empty
        title="There is nothing to check yet"
        action={<Button label="Back to the run" href={`/studies/${run.studyId}/runs/${run.id}`} />}
      >
        A run is checked once its flood is routed to the end.
      </Empty>
    </Screen>
  );
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
