import { useState } from 'react';
import { stationSchema } from '@/shared/studies/schemas';
import type { Station } from '@/shared/studies/types';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useSaveStation } from '@/components/queries/stations';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Notice } from '@/components/ui/Notice';

interface StationFormProps {
  studyId: number;
  /** Null: a new one. */
  station: Station | null;
  onDone: () => void;
}

interface StationValues {
  name: string;
  chainage: number | null;
}

export function StationForm({ studyId, station, onDone }: StationFormProps) {
  const save = useSaveStation(studyId);
  const [saved, setSaved] = useState<string | null>(null);
  const initial: StationValues = { name: station?.name ?? '', chainage: station?.chainage ?? null };
  const form = useYupForm({
    schema: stationSchema,
    initial,
    onSubmit: async (body) => {
      await save.mutateAsync({ ...body, id: station?.id });
      setSaved(body.name);
      form.formik.resetForm();
      onDone();
    },
  });
  return (
    <FormRoot form={form} label={station ? 'Change the station' : 'New station'}>
      <FormTextField name="name" label="Name" />
      <FormNumberField
        name="chainage"
        label="Chainage"
        quantity="chainage"
        hint="Along the reach, as in the survey."
      />
      <ButtonRow>
        <FormSubmit label={station ? 'Save' : 'Add'} />
        {station ? <Button label="Leave as it was" onPress={onDone} /> : null}
      </ButtonRow>
      {saved && !form.formik.dirty ? (
        <Notice tone="done">{`${saved} is in the list.`}</Notice>
      ) : null}
    </FormRoot>
  );
}
