import type { Study } from '@/shared/studies/types';
import { studySchema } from '@/shared/studies/schemas';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { useYupForm } from '@/components/forms/useYupForm';
import { useChangeStudy } from '@/components/queries/studies';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Dialog } from '@/components/ui/Dialog';
import { StudyFields } from './StudyFields';

export function ChangeStudyDialog({ study, onClose }: { study: Study; onClose: () => void }) {
  const change = useChangeStudy(study.id);
  const { title, clientName, place, verticalDatum, coordinateSystem, unitSystem, purpose } = study;
  const form = useYupForm({
    schema: studySchema,
    initial: { title, clientName, place, verticalDatum, coordinateSystem, unitSystem, purpose },
    onSubmit: async (body) => {
      await change.mutateAsync(body);
      onClose();
    },
  });
  return (
    <Dialog title="Change the study" open onClose={form.formik.dirty ? undefined : onClose}>
      <FormRoot form={form} label="Change the study">
        <StudyFields />
        <ButtonRow>
          <FormSubmit label="Save" />
          <Button label="Leave as it was" onPress={onClose} />
        </ButtonRow>
      </FormRoot>
    </Dialog>
  );
}
