import { router } from 'expo-router';
import { useState } from 'react';
import { pictureOfScenario } from '@/components/charts/picture/pictureSources';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useReach } from '@/components/queries/reaches';
import { useRequestRun } from '@/components/queries/runs';
import { useStations } from '@/components/queries/stations';
import { Badge } from '@/components/ui/Badge';
import { ErrorState } from '@/components/ui/ErrorState';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Scenario } from '@/shared/scenarios/types';
import { structureMarks } from '@/shared/structures/structureMarks';
import { DetailsPart } from './DetailsPart';
import { EditorBar } from './EditorBar';
import { EditorProvider } from './editorContext';
import { InitialPart } from './InitialPart';
import { LateralsPart } from './LateralsPart';
import { LocalLossesPart } from './LocalLossesPart';
import { NumericsPart } from './NumericsPart';
import { OutletPart } from './OutletPart';
import { ReadinessCard } from './ReadinessCard';
import { RoughnessPart } from './RoughnessPart';
import { StructuresPart } from './structures/StructuresPart';
import { UnsavedNotice } from './UnsavedNotice';
import { UpstreamPart } from './UpstreamPart';
import { usePartOfAddress } from './usePartOfAddress';
import { useScenarioEditor } from './useScenarioEditor';
import { whyNotRouted } from './whyNotRouted';

/** The whole scenario on one page, checked as it is typed; saving and routing are asked for. */
export function ScenarioEditor({ scenario }: { scenario: Scenario }) {
  const { study, may } = useCurrentStudy();
  const system = useUnitSystem();
  const { at, setAt } = usePlaceAndTime();
  const [reachId, setReachId] = useState(scenario.body.reachId);
  const reach = useReach(reachId);
  const stations = useStations(study.id).data;
  const editor = useScenarioEditor(scenario, reach.data);
  const request = useRequestRun(study.id);
  const isLocked = !may('scenario.change');
  usePartOfAddress();
  // The draft chooses the reach that it is checked against.
  if (editor.draft.reachId !== reachId) setReachId(editor.draft.reachId);

  const reason = whyNotRouted(editor, reach.data !== undefined);
  const route = () =>
    request.mutate(scenario.id, {
      onSuccess: (run) => router.push(`/studies/${study.id}/runs/${run.id}`),
    });
  return (
    <EditorProvider value={{ editor, scenario, reach: reach.data, isLocked }}>
      <Screen
        title={editor.draft.name || 'Scenario without a name'}
        picture={pictureOfScenario(study, editor.draft.name || 'Scenario without a name')}
        crumbs={[
          { label: study.title, href: `/studies/${study.id}` },
          { label: 'Scenarios', href: `/studies/${study.id}/scenarios` },
        ]}
        badge={
          editor.isDirty ? (
            <Badge label="Not saved" tone="ochre" />
          ) : editor.faults.length > 0 ? (
            <Badge label="Draft" />
          ) : undefined
        }
        footer={
          isLocked ? undefined : (
            <EditorBar
              {...{ reason, route }}
              isRouting={request.isPending}
              routeError={request.error}
            />
          )
        }
        ribbon={
          reach.data ? (
            <ReachRibbon
              sections={reach.data.sections}
              stations={stations}
              advice={reach.data.advice}
              structures={structureMarks(editor.draft.structures)}
              at={at ?? reach.data.firstChainage}
              onChange={setAt}
              unitSystem={system}
            />
          ) : undefined
        }
        side={
          <>
            <UnsavedNotice />
            {reach.isError ? (
              <ErrorState
                title="The reach could not be read"
                error={reach.error}
                retry={() => void reach.refetch()}
              />
            ) : null}
            <ReadinessCard />
          </>
        }
      >
        <DetailsPart />
        <UpstreamPart />
        <LateralsPart />
        <StructuresPart at={at} />
        <RoughnessPart />
        <LocalLossesPart />
        <OutletPart />
        <InitialPart />
        <NumericsPart />
      </Screen>
    </EditorProvider>
  );
}
