import { useState } from 'react';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { FormTextField } from '@/components/forms/FormTextField';
import { useYupForm } from '@/components/forms/useYupForm';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace, useTime } from '@/components/charts/usePlaceAndTime';
import { useRaisePoint } from '@/components/queries/reviews';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { LIMITS } from '@/shared/limits';
import { pointSchema } from '@/shared/review/schemas';
import type { Run, RunSummary } from '@/shared/runs/types';
import { pointPlace } from './reviewWords';

interface Props {
  run: Run;
  summary: RunSummary;
  store: PlaceAndTimeStore;
  onDone: () => void;
}

type About = 'run' | 'place' | 'moment';

/** A point on what the drawings stand at; the choice follows them while it is written. */
export function RaisePoint({ run, summary, store, onDone }: Props) {
  const raise = useRaisePoint(run.id);
  const unitSystem = useUnitSystem();
  const [about, setAbout] = useState<About>('moment');
  const chainage = usePlace(store);
  const time = useTime(store);
  const where = (of: { chainage: number | null; time: number | null }) =>
    pointPlace(of, summary.stations, run.duration, unitSystem) ?? '';
  const form = useYupForm({
    schema: pointSchema,
    initial: { text: '', chainage: null as number | null, time: null as number | null },
    onSubmit: async ({ text }) => {
      await raise.mutateAsync({
        text,
        chainage: about === 'run' ? null : chainage,
        time: about === 'moment' ? time : null,
      });
      onDone();
    },
  });
  return (
    <FormRoot form={form} label="Raise a point" failedTitle="Not raised">
      <RadioGroup
        label="It is about"
        hint="Press on a drawing, or move the ribbons, to choose another place and time."
        value={about}
        options={[
          { value: 'moment', label: 'This place at this time', hint: where({ chainage, time }) },
          { value: 'place', label: 'This place', hint: where({ chainage, time: null }) },
          { value: 'run', label: 'The run as a whole' },
        ]}
        onChange={setAbout}
      />
      <FormTextField
        name="text"
        label="Point"
        hint="What is wrong or unclear, and what would settle it."
        lines={4}
        maxLength={LIMITS.textLong}
      />
      <ButtonRow>
        <FormSubmit kind="outline" label="Raise the point" />
        <Button kind="quiet" label="Leave" onPress={onDone} />
      </ButtonRow>
    </FormRoot>
  );
}
