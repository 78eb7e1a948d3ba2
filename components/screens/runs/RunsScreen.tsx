import { View } from 'react-native';
import { usePlaceAndTimeStore } from '@/components/charts/usePlaceAndTime';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { useRuns } from '@/components/queries/runs';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { RunEntry } from './RunEntry';

/** All runs of a study, newest first. */
export function RunsScreen() {
  const { study } = useCurrentStudy();
  const runs = useRuns(study.id);
  // Nothing here follows place and time, but the address keeps them from screen to screen.
  usePlaceAndTimeStore();
  if (isApiError(runs.error, 'notFound')) return <NotThere />;
  const root = `/studies/${study.id}` as const;
  const routed = runs.data?.filter(({ state }) => state === 'routed').length ?? 0;
  return (
    <Screen
      title="Runs"
      crumbs={[{ label: study.title, href: root }, { label: 'Runs' }]}
      actions={routed >= 2 ? <Button label="Compare runs" href={`${root}/compare`} /> : undefined}
      lead="Each run keeps the survey, the roughness and the flood that it was given. A change makes a new run."
    >
      {runs.error ? (
        <ErrorState
          error={runs.error}
          title="The runs could not be read"
          retry={() => void runs.refetch()}
        />
      ) : null}
      {runs.isPending ? <Loading what="Reading the runs…" /> : null}
      {runs.data?.length === 0 ? (
        <Empty
          title="No flood has been routed yet"
          action={<Button label="Go to the scenarios" href={`${root}/scenarios`} />}
        >
          Open a scenario, see that nothing is missing, and route its flood. It then stands here
          while it computes and when it is done.
        </Empty>
      ) : null}
      {runs.data?.length ? (
        <View role="list" aria-label="Runs">
          {runs.data.map((run) => (
            <RunEntry key={run.id} run={run} studyId={study.id} />
          ))}
        </View>
      ) : null}
    </Screen>
  );
}
