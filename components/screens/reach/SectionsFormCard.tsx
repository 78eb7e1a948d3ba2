import { useState } from 'react';
import { View } from 'react-native';
import { FormRadioGroup } from '@/components/forms/FormRadioGroup';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import type { Reach, ReachSection } from '@/shared/reaches/types';
import { BankFields } from './BankFields';
import { describeChoice, type SectionChoice } from './sectionChoice';
import { RoughnessFields } from './RoughnessFields';
import { ScopeFields } from './ScopeFields';
import { changesNothing } from './sectionsForm';
import { useSectionsForm } from './useSectionsForm';

interface SectionsFormCardProps {
  reach: Reach;
  section: ReachSection;
  ticked: SectionChoice;
  onClose: () => void;
}

/** Bank marks and roughness of one section, a stretch, the ticked ones, or all. */
export function SectionsFormCard({ reach, section, ticked, onClose }: SectionsFormCardProps) {
  const [saved, setSaved] = useState<SectionChoice | null>(null);
  const { form, scope, setScope, ids, isConflict } = useSectionsForm({
    reach,
    section,
    ticked,
    onSaved: setSaved,
  });
  const { values } = form.formik;
  const nothing = changesNothing(values);
  const hint =
    ids.length === 0
      ? 'Choose the sections first.'
      : nothing
        ? 'Say above what is to change.'
        : `Changes ${describeChoice(ids)}.`;
  return (
    <Card title="Banks and roughness" aside={describeChoice(ids)}>
      <FormRoot form={form} label="Banks and roughness">
        <ScopeFields {...{ reach, section, ticked, scope }} onChange={setScope} />
        <FormRadioGroup
          name="banks"
          label="Bank marks"
          options={[
            { value: 'keep', label: 'Leave as they are' },
            { value: 'set', label: 'Set them' },
            { value: 'clear', label: 'Take them away' },
          ]}
        />
        {values.banks === 'set' ? <BankFields several={ids.length > 1} /> : null}
        <FormRadioGroup
          name="roughness"
          label="Roughness"
          options={[
            { value: 'keep', label: 'Leave as it is' },
            { value: 'byBank', label: 'Left, channel and right of the bank marks' },
            { value: 'byOffset', label: 'Zones by offset' },
          ]}
        />
        {values.roughness === 'keep' ? null : <RoughnessFields roughness={values.roughness} />}
        <FormSubmit
          label="Save banks and roughness"
          wide
          disabled={nothing || ids.length === 0}
          hint={hint}
        />
      </FormRoot>
      {isConflict ? (
        <Notice tone="attention" title="Somebody else changed this reach meanwhile">
          The reach is shown as it now stands. What you typed is still in the form: compare, and
          save again if it should go over the newer state.
        </Notice>
      ) : null}
      {saved ? (
        <Notice tone="done" title="Saved">
          <Txt>
            {describeChoice(saved)} changed. Runs already made keep the reach they were routed on.
          </Txt>
        </Notice>
      ) : null}
      <View>
        <Button label="Close" kind="quiet" onPress={onClose} />
      </View>
    </Card>
  );
}
