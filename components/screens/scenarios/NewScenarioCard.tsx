import { router } from 'expo-router';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSelectField } from '@/components/forms/FormSelectField';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useCreateScenario } from '@/components/queries/scenarios';
import { Card } from '@/components/ui/Card';
import { LIMITS } from '@/shared/limits';
import { newestReach } from '@/shared/reaches/newestReach';
import type { ReachRow } from '@/shared/reaches/types';
import { newScenarioSchema } from '@/shared/scenarios/schemas';

/** A new scenario: a name and a reach; the rest is proposed and then edited. */
export function NewScenarioCard({ reaches }: { reaches: readonly ReachRow[] }) {
  const { study } = useCurrentStudy();
  const create = useCreateScenario(study.id);
  const newest = newestReach(reaches) ?? reaches[0];
  const form = useYupForm({
    schema: newScenarioSchema,
    // A select speaks text; the schema casts it back to the number.
    initial: { name: '', reachId: String(newest.id) },
    onSubmit: async (body) => {
      const scenario = await create.mutateAsync(body);
      router.push(`/studies/${study.id}/scenarios/${scenario.id}`);
    },
  });
  return (
    <Card title="New scenario">
      <FormRoot form={form} label="New scenario">
        <FormTextField
          name="name"
          label="Name"
          hint="Like “1 in 100 year, 20 % more”."
          maxLength={LIMITS.textShort}
        />
        {reaches.length > 1 ? (
          <FormSelectField
            name="reachId"
            label="Reach"
            options={reaches.map(({ id, name }) => ({ value: String(id), label: name }))}
          />
        ) : null}
        <FormSubmit label="Make the scenario" wide />
      </FormRoot>
    </Card>
  );
}
