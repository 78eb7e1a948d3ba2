import { useState } from 'react';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { useDuplicateScenario } from '@/components/queries/scenarios';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { SelectField } from '@/components/ui/SelectField';
import { LIMITS } from '@/shared/limits';
import { CHANGED_AT, type ScenarioChange } from '@/shared/scenarios/changeScenario';
import { duplicateScenarioSchema } from '@/shared/scenarios/schemas';
import type { ScenarioRow } from '@/shared/scenarios/types';
import { CHANGE_FIELDS, CHANGE_OPTIONS, type ChangeOption } from './changeWords';

interface DuplicateDialogProps {
  row: ScenarioRow;
  onClose: () => void;
  /** `part` is where the change is seen; null where nothing was changed yet. */
  onMade: (scenarioId: number, part: string | null) => void;
}

interface Values {
  name: string;
  change: ScenarioChange | { kind: string; value: null } | null;
}

/** A copy under another name, to vary; the usual changes are made at once. */
export function DuplicateDialog({ row, onClose, onMade }: DuplicateDialogProps) {
  const { study } = useCurrentStudy();
  const duplicate = useDuplicateScenario(study.id);
  const [kind, setKind] = useState<ChangeOption>('none');
  const initial: Values = { name: `${row.name}, varied`.slice(0, LIMITS.textShort), change: null };
  const form = useYupForm({
    schema: duplicateScenarioSchema,
    initial,
    onSubmit: async ({ name, change }) => {
      const copy = await duplicate.mutateAsync({ scenarioId: row.id, name, change });
      onClose();
      onMade(copy.id, change && CHANGED_AT[change.kind]);
    },
  });
  const choose = (next: ChangeOption) => {
    setKind(next);
    void form.formik.setFieldValue('change', next === 'none' ? null : { kind: next, value: null });
  };
  return (
    <Dialog title={`Duplicate ${row.name}`} open onClose={onClose}>
      <FormRoot form={form} label={`Duplicate ${row.name}`}>
        <FormTextField
          name="name"
          label="Name of the copy"
          maxLength={LIMITS.textShort}
          autoFocus
        />
        <SelectField
          label="Change at once"
          value={kind}
          options={CHANGE_OPTIONS}
          onChange={choose}
          error={form.errorOf('change.kind')}
        />
        {kind === 'none' ? null : (
          <FormNumberField key={kind} name="change.value" {...CHANGE_FIELDS[kind]} />
        )}
        <FormSubmit label="Make the copy" wide />
        <Button label="Close" wide onPress={onClose} />
      </FormRoot>
    </Dialog>
  );
}
