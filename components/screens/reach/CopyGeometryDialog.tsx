import { router } from 'expo-router';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useCopyGeometry } from '@/components/queries/geometries';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { Txt } from '@/components/ui/Txt';
import { LIMITS } from '@/shared/limits';
import { geometryNameSchema } from '@/shared/reaches/schemas';
import type { ReachRow } from '@/shared/reaches/types';

interface CopyGeometryDialogProps {
  /** What is copied. */
  reach: Pick<ReachRow, 'id' | 'name'>;
  onClose: () => void;
}

/** A working geometry under a name of its own; it opens when it is made. */
export function CopyGeometryDialog({ reach, onClose }: CopyGeometryDialogProps) {
  const { study } = useCurrentStudy();
  const copy = useCopyGeometry(study.id);
  const form = useYupForm({
    schema: geometryNameSchema,
    initial: { name: '' },
    onSubmit: async ({ name }) => {
      const made = await copy.mutateAsync({ name, copyOf: reach.id });
      onClose();
      router.push(`/studies/${study.id}/reach/${made.id}`);
    },
  });
  return (
    <Dialog title={`A working geometry of ${reach.name}`} open onClose={onClose}>
      <Txt>
        It begins as a copy. What you change in it leaves {reach.name} and the survey as they are;
        scenarios choose which of them they are routed on.
      </Txt>
      <FormRoot form={form} label={`A working geometry of ${reach.name}`} failedTitle="Not made">
        <FormTextField
          name="name"
          label="Name"
          hint="Like “Dredged” or “Bridge opened”."
          maxLength={LIMITS.textShort}
          autoFocus
        />
        <FormSubmit label="Make the working geometry" wide />
        <Button label="Close" wide onPress={onClose} />
      </FormRoot>
    </Dialog>
  );
}
