import { useState } from 'react';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useFormField } from '@/components/forms/useFormField';
import { useYupForm } from '@/components/forms/useYupForm';
import { useSaveGauge } from '@/components/queries/observations';
import { TextField } from '@/components/ui/TextField';
import { gaugeSchema } from '@/shared/calibration/schemas';
import type { Gauge, TimeValues } from '@/shared/calibration/types';
import { clockFromText, clockToText } from '../scenarios/startClock';
import { FloodField } from './FloodField';
import { RecordField } from './RecordField';

interface Props {
  studyId: number;
  /** null: a new one. */
  gauge: Gauge | null;
  floods: readonly string[];
  /** Chosen place, m: offered as its chainage. */
  at: number | null;
  onDone: () => void;
}

interface GaugeValues {
  name: string;
  chainage: number | null;
  flood: string;
  startsAt: string | null;
  stage: TimeValues | null;
  flow: TimeValues | null;
}

export function GaugeForm({ studyId, gauge, floods, at, onDone }: Props) {
  const save = useSaveGauge(studyId);
  const initial: GaugeValues = {
    name: gauge?.name ?? '',
    chainage: gauge?.chainage ?? at,
    flood: gauge?.flood ?? floods[0] ?? '',
    startsAt: gauge?.startsAt ?? null,
    stage: gauge?.stage ?? null,
    flow: gauge?.flow ?? null,
  };
  const form = useYupForm({
    schema: gaugeSchema,
    initial,
    onSubmit: async (body) => {
      await save.mutateAsync({ ...body, id: gauge?.id });
      onDone();
    },
  });
  return (
    <FormRoot form={form} label="Gauge record">
      <FormTextField name="name" label="Name" />
      <FormNumberField name="chainage" label="Chainage" quantity="chainage" />
      <Flood floods={floods} />
      <Clock />
      <RecordField name="stage" quantity="stage" label="Stage of the gauge" />
      <RecordField name="flow" quantity="flow" label="Flow of the gauge" />
      <FormSubmit label={gauge ? 'Save' : 'Add the record'} wide />
    </FormRoot>
  );
}

function Flood({ floods }: { floods: readonly string[] }) {
  const { value, error, disabled, onChange } = useFormField<string>('flood');
  return <FloodField {...{ value, error, disabled, onChange, floods }} />;
}

/** A table with dates sets it by itself. */
function Clock() {
  const { value, error, disabled, onChange } = useFormField<string | null>('startsAt');
  const [typed, setTyped] = useState<string | null>(null);
  const kept = typed !== null && clockFromText(typed).iso === value;
  const text = kept ? typed : clockToText(value);
  return (
    <TextField
      label="Begins at"
      optional
      hint="Day and time of its 0 h, like 2024-01-09 06:00, as in the scenario. Empty: its hours count from the start of the run."
      value={text}
      disabled={disabled}
      error={(kept && clockFromText(typed).fault) || error}
      onChange={(next) => {
        setTyped(next);
        onChange(clockFromText(next).iso);
      }}
    />
  );
}
