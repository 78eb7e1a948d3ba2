import { useState } from 'react';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSelectField } from '@/components/forms/FormSelectField';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useFormField } from '@/components/forms/useFormField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useChangeMark, useRemoveMark } from '@/components/queries/observations';
import { Button } from '@/components/ui/Button';
import { ConfirmDialog } from '@/components/ui/ConfirmDialog';
import { Dialog } from '@/components/ui/Dialog';
import {
  CONFIDENCE_WORDS,
  KIND_WORDS,
  MARK_CONFIDENCES,
  MARK_KINDS,
  MARK_TOLERANCE,
} from '@/shared/calibration/marks';
import { markSchema } from '@/shared/calibration/schemas';
import type { Mark } from '@/shared/calibration/types';
import { formatWithUnit } from '@/shared/units/format';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { FloodField } from './FloodField';

interface Props {
  mark: Mark;
  floods: readonly string[];
  onClose: () => void;
}

/** Changes or removes one mark. */
export function MarkDialog({ mark, floods, onClose }: Props) {
  const system = useUnitSystem();
  const change = useChangeMark();
  const remove = useRemoveMark();
  const [isLeaving, setIsLeaving] = useState(false);
  const { id, ...initial } = mark;
  const form = useYupForm({
    schema: markSchema,
    initial: { ...initial, observedOn: initial.observedOn ?? '' },
    onSubmit: async (body) => {
      await change.mutateAsync({ ...body, id });
      onClose();
    },
  });
  const name = `Mark at ${formatWithUnit(mark.chainage, 'chainage', system)}`;
  if (isLeaving)
    return (
      <ConfirmDialog
        title={`Remove the mark at ${formatWithUnit(mark.chainage, 'chainage', system)}?`}
        confirm="Remove"
        onClose={() => setIsLeaving(false)}
        onConfirm={() => remove.mutateAsync(id).then(onClose)}
      >
        Runs are no longer compared with it. What was signed keeps it.
      </ConfirmDialog>
    );
  return (
    <Dialog title={name} open onClose={onClose}>
      <FormRoot form={form} label={name}>
        <FormNumberField name="chainage" label="Chainage" quantity="chainage" />
        <FormNumberField name="level" label="Level of the water" quantity="elevation" />
        <FormSelectField
          name="kind"
          label="Kind"
          options={MARK_KINDS.map((value) => ({ value, label: KIND_WORDS[value] }))}
        />
        <FormSelectField
          name="confidence"
          label="Confidence"
          hint="What a model that fits may leave at such a mark."
          options={MARK_CONFIDENCES.map((value) => ({
            value,
            label: `${CONFIDENCE_WORDS[value]}, ±${formatWithUnit(MARK_TOLERANCE[value], 'depth', system)}`,
          }))}
        />
        <Flood floods={floods} />
        <FormTextField name="observedOn" label="Seen on" optional hint="A day, like 2024-01-09." />
        <FormTextField name="note" label="Note" optional lines={2} />
        <FormSubmit label="Save" wide />
        <Button kind="danger" label="Remove" wide onPress={() => setIsLeaving(true)} />
      </FormRoot>
    </Dialog>
  );
}

function Flood({ floods }: { floods: readonly string[] }) {
  const { value, error, disabled, onChange } = useFormField<string>('flood');
  return <FloodField {...{ value, error, disabled, onChange, floods }} />;
}
