import { FormRadioGroup } from '@/components/forms/FormRadioGroup';
import { FormTextField } from '@/components/forms/FormTextField';

const SYSTEMS = [
  { value: 'metric', label: 'Metric', hint: 'm, km, m³/s' },
  { value: 'usCustomary', label: 'US customary', hint: 'ft, ft³/s' },
] as const;

/** What a study says of itself; the same when it is made and when it is changed. */
export function StudyFields() {
  return (
    <>
      <FormTextField
        name="title"
        label="Title"
        hint="River and place, as colleagues will look for it."
      />
      <FormTextField name="clientName" label="Client" optional />
      <FormTextField name="place" label="Place" hint="Town, county or catchment." optional />
      <FormTextField
        name="verticalDatum"
        label="Vertical datum"
        hint="What the elevations of survey and marks refer to."
      />
      <FormTextField
        name="coordinateSystem"
        label="Coordinate system"
        hint="What eastings and northings refer to, by its usual name or code. It is named in plans; nothing is converted."
        optional
      />
      <FormRadioGroup
        name="unitSystem"
        label="Units"
        hint="For what is shown and typed; stored values stay the same."
        options={SYSTEMS}
      />
      <FormTextField
        name="purpose"
        label="Purpose"
        hint="What is asked, and what the answer will be used for."
        lines={4}
        optional
      />
    </>
  );
}
