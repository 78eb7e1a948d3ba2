import { useRouter } from 'expo-router';
import { studySchema } from '@/shared/studies/schemas';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { useYupForm } from '@/components/forms/useYupForm';
import { Screen } from '@/components/layout/Screen';
import { useCreateStudy } from '@/components/queries/studies';
import { Card } from '@/components/ui/Card';
import { StudyFields } from './StudyFields';

export function NewStudyScreen() {
  const router = useRouter();
  const create = useCreateStudy();
  const form = useYupForm({
    schema: studySchema,
    initial: {
      title: '',
      clientName: '',
      place: '',
      verticalDatum: '',
      coordinateSystem: '',
      unitSystem: 'metric',
      purpose: '',
    },
    onSubmit: async (body) => {
      const study = await create.mutateAsync(body);
      router.replace(`/studies/${study.id}`);
    },
  });
  return (
    <Screen
      title="New study"
      crumbs={[{ label: 'Studies', href: '/' }]}
      lead="One question about one reach: the survey, the scenarios and their runs come under it."
      narrow
    >
      <Card>
        <FormRoot form={form} label="New study" failedTitle="Study not made">
          <StudyFields />
          <FormSubmit label="Make the study" />
        </FormRoot>
      </Card>
    </Screen>
  );
}
