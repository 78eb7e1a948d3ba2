import { useState } from 'react';
import { stationSchema } from '@/shared/studies/schemas';
import type { Station } from '@/shared/studies/types';
import { formatWithUnit } from '@/shared/units/format';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useSaveStation } from '@/components/queries/stations';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Notice } from '@/components/ui/Notice';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { isOutside, spanText } from './reachSpan';
import { StationLevels, type TypedLevel } from './StationLevels';
import { useNewestReachRow } from './useNewestReach';

interface StationFormProps {
  studyId: number;
  /** Null: a new one. */
  station: Station | null;
  /** Chosen place on the ribbon, m: offered as its chainage. */
  at?: number | null;
  onDone?: () => void;
}

interface StationValues {
  name: string;
  chainage: number | null;
  levels: TypedLevel[];
}

export function StationForm({ studyId, station, at = null, onDone }: StationFormProps) {
  const save = useSaveStation(studyId);
  const system = useUnitSystem();
  const reach = useNewestReachRow(studyId);
  const [saved, setSaved] = useState<string | null>(null);
  const initial: StationValues = {
    name: station?.name ?? '',
    chainage: station?.chainage ?? null,
    levels: station?.levels ?? [],
  };
  const form = useYupForm({
    schema: stationSchema,
    initial,
    onSubmit: async (body) => {
      await save.mutateAsync({ ...body, id: station?.id });
      setSaved(body.name);
      form.formik.resetForm();
      onDone?.();
    },
  });
  const { chainage } = form.formik.values;
  return (
    <FormRoot form={form} label={station ? 'Change the station' : 'New station'}>
      <FormTextField name="name" label="Name" />
      <FormNumberField
        name="chainage"
        label="Chainage"
        quantity="chainage"
        hint={`Along the reach, as in the survey${reach ? `: ${spanText(reach, system)}` : ''}.`}
      />
      {at !== null && chainage !== at ? (
        <Button
          kind="quiet"
          label={`Take the place on the ribbon, ${formatWithUnit(at, 'chainage', system)}`}
          onPress={() => void form.formik.setFieldValue('chainage', at)}
        />
      ) : null}
      {reach && chainage !== null && isOutside(chainage, reach) ? (
        <Notice tone="attention">
          {`Outside the surveyed reach, ${spanText(reach, system)}: nothing is computed there, and no table will show it.`}
        </Notice>
      ) : null}
      <StationLevels />
      <ButtonRow>
        <FormSubmit label={station ? 'Save' : 'Add'} />
        {station ? <Button label="Leave as it was" onPress={onDone} /> : null}
      </ButtonRow>
      {saved && !form.formik.dirty ? <Notice tone="done">{`${saved} was added.`}</Notice> : null}
    </FormRoot>
  );
}
