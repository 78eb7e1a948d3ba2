import { useLocalSearchParams } from 'expo-router';
import { NotThere } from '@/components/layout/NotThere';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { isApiError } from '@/components/queries/ApiError';
import { useScenario } from '@/components/queries/scenarios';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { ScenarioEditor } from './ScenarioEditor';

/** One scenario, open to be edited. */
export function ScenarioScreen() {
  const { study } = useCurrentStudy();
  const { scenarioId } = useLocalSearchParams<{ scenarioId: string }>();
  const scenario = useScenario(Number(scenarioId));
  if (scenario.data) return <ScenarioEditor key={scenario.data.id} scenario={scenario.data} />;
  if (isApiError(scenario.error, 'notFound')) return <NotThere />;
  return (
    <Screen
      title="Scenario"
      crumbs={[
        { label: study.title, href: `/studies/${study.id}` },
        { label: 'Scenarios', href: `/studies/${study.id}/scenarios` },
      ]}
    >
      {scenario.error ? (
        <ErrorState
          title="The scenario could not be read"
          error={scenario.error}
          retry={() => void scenario.refetch()}
        />
      ) : (
        <Loading what="Reading the scenario…" />
      )}
    </Screen>
  );
}
