import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useReaches } from '@/components/queries/reaches';
import { useScenarios } from '@/components/queries/scenarios';
import { Button } from '@/components/ui/Button';
import { Empty } from '@/components/ui/Empty';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { NewScenarioCard } from './NewScenarioCard';
import { ScenarioCard } from './ScenarioCard';

/** The floods of a study: what comes in, how it begins, where it leaves. */
export function ScenariosScreen() {
  const { study, may } = useCurrentStudy();
  const scenarios = useScenarios(study.id);
  const reaches = useReaches(study.id);
  const hasReach = (reaches.data?.length ?? 0) > 0;
  const error = scenarios.error ?? reaches.error;
  return (
    <Screen
      title="Scenarios"
      crumbs={[{ label: study.title, href: `/studies/${study.id}` }]}
      side={
        hasReach && may('scenario.change') ? (
          <NewScenarioCard reaches={reaches.data ?? []} />
        ) : undefined
      }
    >
      {error ? (
        <ErrorState
          title="The scenarios could not be read"
          error={error}
          retry={() => void (scenarios.error ? scenarios : reaches).refetch()}
        />
      ) : !scenarios.data || !reaches.data ? (
        <Loading what="Reading the scenarios…" />
      ) : !hasReach ? (
        <Empty
          title="No reach to route on yet"
          action={
            <Button label="To the survey" kind="solid" href={`/studies/${study.id}/survey`} />
          }
        >
          A scenario stands on a reach, and a reach is made of the first survey that is taken in.
        </Empty>
      ) : scenarios.data.length === 0 ? (
        <Empty title="No scenario yet">
          Name the first one. Its settings are proposed to fit the reach; the flood is yours to
          give.
        </Empty>
      ) : (
        scenarios.data.map((row) => (
          <ScenarioCard
            key={row.id}
            row={row}
            reachName={reaches.data.find(({ id }) => id === row.reachId)?.name ?? ''}
          />
        ))
      )}
    </Screen>
  );
}
