import { useRouter } from 'expo-router';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useScenarioOfSearch } from '@/components/queries/calibration';
import { Card } from '@/components/ui/Card';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { fromSearchSchema } from '@/shared/calibration/search/schemas';
import type { SearchSettings } from '@/shared/calibration/search/types';
import type { TaskSet } from '@/shared/tasks/types';
import { floodName } from './floodWords';

/** What the search found becomes a scenario only here, by a person. */
export function MakeScenarioCard({ set, settings }: { set: TaskSet; settings: SearchSettings }) {
  const { study } = useCurrentStudy();
  const router = useRouter();
  const make = useScenarioOfSearch(study.id, set.id);
  const form = useYupForm({
    schema: fromSearchSchema,
    initial: { name: `Fitted to ${floodName(settings.flood)}`.slice(0, 120) },
    onSubmit: async ({ name }) => {
      const { scenarioId, changed } = await make.mutateAsync(name);
      if (!changed) router.push(`/studies/${study.id}/scenarios/${scenarioId}`);
    },
  });
  return (
    <Card title="Make a scenario with these">
      <Txt>
        A copy of the scenario with the best multipliers beside its roughness. Look at it, and route
        it on its own cells before you rely on it.
      </Txt>
      {make.data?.changed ? (
        <>
          <Notice tone="attention" title="The scenario has changed since">
            {`It is no longer what run ${set.runNumber} routed. The copy is made from it as it stands now: look at what changed before you route it.`}
          </Notice>
          <Button
            kind="solid"
            label="Open the copy"
            href={`/studies/${study.id}/scenarios/${make.data.scenarioId}`}
          />
        </>
      ) : (
        <FormRoot form={form} label="Make a scenario" failedTitle="Not made">
          <FormTextField name="name" label="Name of the scenario" maxLength={120} />
          <FormSubmit label="Make the scenario" />
        </FormRoot>
      )}
    </Card>
  );
}
