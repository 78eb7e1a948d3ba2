import { Screen } from '@/components/layout/Screen';
import { useRunSummary } from '@/components/queries/runs';
import { Badge } from '@/components/ui/Badge';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { Run } from '@/shared/runs/types';
import { runBadge } from '../../check/reviewWords';
import { runCrumbs } from '../runCrumbs';
import { ResultsScreen } from './ResultsScreen';

/** What came out of a run, once it is read. */
export function RunResults({ run }: { run: Run }) {
  const { data: summary, error, refetch } = useRunSummary(run.id);
  if (summary) return <ResultsScreen run={run} summary={summary} />;
  return (
    <Screen title={run.scenarioName} crumbs={runCrumbs(run)} badge={<Badge {...runBadge(run)} />}>
      {error ? (
        <ErrorState
          error={error}
          title="The results could not be read"
          retry={() => void refetch()}
        />
      ) : (
        <Loading what="Reading the results…" />
      )}
    </Screen>
  );
}
