import { useState } from 'react';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Parameter } from '@/shared/confidence/parameters';
import { valueWords } from '@/shared/confidence/planMembers';
import { CellSizeField } from './CellSizeField';
import { FieldRow } from './FieldRow';
import { ParameterRows } from './ParameterRows';
import { useSetForm, type SetFormProps } from './useSetForm';

const begin = ({ key, sides: [low, high] }: Parameter) => ({ key, low, high });

/** Each input lower and higher by itself. */
export function SensitivityForm(props: SetFormProps) {
  const { options } = props;
  const system = useUnitSystem();
  const [open, setOpen] = useState(false);
  const form = useSetForm('sensitivity', props, {
    name: '',
    cellSize: null as number | null,
    parameters: options.parameters.map(begin),
  });
  const rows = form.formik.values.parameters;
  const words = rows.map(({ key, low, high }) => {
    const { label } = options.parameters.find((one) => one.key === key)!;
    return `${label} ${valueWords(key, low, system)} and ${valueWords(key, high, system)}`;
  });
  // What the server or the schema refused must be seen.
  const shown = open || form.failure !== null || !form.formik.isValid;
  return (
    <Card title="Sensitivity">
      <Txt tone="soft">
        Each input lower and higher by itself, the others as they are: which of them moves the peak
        stage, the peak flow and the arrival most.
      </Txt>
      <FormRoot form={form} label="Sensitivity" failedTitle="Not started">
        {shown ? (
          <>
            <ParameterRows parameters={options.parameters} begin={begin}>
              {({ measure }, path) => (
                <FieldRow>
                  <FormNumberField name={`${path}.low`} {...sideLabel('Lower', measure)} />
                  <FormNumberField name={`${path}.high`} {...sideLabel('Upper', measure)} />
                </FieldRow>
              )}
            </ParameterRows>
            <CellSizeField options={options} times={2 * rows.length + 1} />
          </>
        ) : (
          <Txt>{`${words.join('; ')}.`}</Txt>
        )}
        <ButtonRow>
          <FormSubmit kind="outline" label={`Compute ${2 * rows.length + 1} cases`} />
          {shown ? null : (
            <Button
              kind="quiet"
              label="Change the values"
              name="Change the values of the sensitivity"
              onPress={() => setOpen(true)}
            />
          )}
        </ButtonRow>
      </FormRoot>
    </Card>
  );
}

const sideLabel = (side: string, measure: Parameter['measure']) =>
  measure === 'factor'
    ? { label: `${side} factor` }
    : { label: `${side} shift`, quantity: 'depth' as const };
