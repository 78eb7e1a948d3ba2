import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useDuplicateScenario } from '@/components/queries/scenarios';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { LIMITS } from '@/shared/limits';
import { duplicateScenarioSchema } from '@/shared/scenarios/schemas';
import type { ScenarioRow } from '@/shared/scenarios/types';

interface DuplicateDialogProps {
  row: ScenarioRow;
  onClose: () => void;
  onMade: (scenarioId: number) => void;
}

/** A copy under another name, to vary. */
export function DuplicateDialog({ row, onClose, onMade }: DuplicateDialogProps) {
  const { study } = useCurrentStudy();
  const duplicate = useDuplicateScenario(study.id);
  const form = useYupForm({
    schema: duplicateScenarioSchema,
    initial: { name: `${row.name}, varied`.slice(0, LIMITS.textShort) },
    onSubmit: async ({ name }) => {
      const copy = await duplicate.mutateAsync({ scenarioId: row.id, name });
      onClose();
      onMade(copy.id);
    },
  });
  return (
    <Dialog title={`Duplicate ${row.name}`} open onClose={onClose}>
      <FormRoot form={form} label={`Duplicate ${row.name}`}>
        <FormTextField
          name="name"
          label="Name of the copy"
          maxLength={LIMITS.textShort}
          autoFocus
        />
        <FormSubmit label="Make the copy" wide />
        <Button label="Close" wide onPress={onClose} />
      </FormRoot>
    </Dialog>
  );
}
