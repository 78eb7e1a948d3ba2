import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
import { usePlaceAndTimeStore } from '@/components/charts/usePlaceAndTime';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { useRuns } from '@/components/queries/runs';
import { useTaskSets } from '@/components/queries/tasks';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { CONFIDENCE_KINDS } from '@/shared/confidence/schemas';
import { confidenceCrumbs } from './confidenceWords';
import { SetsCard } from './SetsCard';
import { StartCards } from './start/StartCards';

/** What was found out about how far the numbers carry, and the three ways to find out more. */
export function ConfidenceScreen() {
  const { study } = useCurrentStudy();
  const params = useLocalSearchParams<{ run?: string }>();
  const runs = useRuns(study.id);
  const sets = useTaskSets(study.id);
  const [chosen, setChosen] = useState<number | null>(null);
  // Nothing here follows place and time, but the address keeps them from screen to screen.
  usePlaceAndTimeStore();
  if (isApiError(sets.error, 'notFound')) return <NotThere />;

  const routed = runs.data?.filter(({ state }) => state === 'routed') ?? [];
  const wanted = chosen ?? (params.run ? Number(params.run) : null);
  const run = routed.find(({ id }) => id === wanted) ?? routed[0];
  const shown = sets.data?.filter(({ kind }) =>
    (CONFIDENCE_KINDS as readonly string[]).includes(kind),
  );
  const failed = sets.error ? sets : runs.error ? runs : null;
  return (
    <Screen
      title="Confidence"
      crumbs={confidenceCrumbs(study)}
      lead="One run is one answer. These sets compute its flood again and again, with other cells or other inputs, and tell how far its numbers carry."
    >
      {failed ? (
        <ErrorState
          error={failed.error}
          title="The sets could not be read"
          retry={() => void failed.refetch()}
        />
      ) : null}
      {sets.isPending || runs.isPending ? <Loading what="Reading what was computed…" /> : null}
      {runs.data && !run ? (
        <Empty
          title="There is no routed run yet"
          action={<Button label="Go to the runs" href={`/studies/${study.id}/runs`} />}
        >
          A set varies the frozen inputs of a run that has been routed to its end.
        </Empty>
      ) : null}
      {shown?.length ? <SetsCard sets={shown} studyId={study.id} /> : null}
      {run && sets.data ? <StartCards runs={routed} run={run} onChoose={setChosen} /> : null}
    </Screen>
  );
}
