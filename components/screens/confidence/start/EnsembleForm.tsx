import { useState } from 'react';
import { FormNumberField } from '@/components/forms/FormNumberField';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { Button } from '@/components/ui/Button';
import { ButtonRow } from '@/components/ui/ButtonRow';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Distribution } from '@/shared/confidence/distributions';
import type { Parameter } from '@/shared/confidence/parameters';
import type { ConfidenceOptions } from '@/shared/confidence/types';
import { formatChosenLength } from '@/shared/units/format';
import { distributionWords } from '@/shared/confidence/settingWords';
import { computingWords, estimate } from '../confidenceWords';
import { CellSizeField } from './CellSizeField';
import { DistributionFields } from './DistributionFields';
import { FieldRow } from './FieldRow';
import { ParameterRows } from './ParameterRows';
import { useSetForm, type SetFormProps } from './useSetForm';

const begin = ({
  key,
  distribution,
}: Parameter): { key: Parameter['key']; distribution: Distribution } => ({
  key,
  distribution,
});

/** Many members with inputs drawn at random. */
export function EnsembleForm(props: SetFormProps) {
  const { options } = props;
  const system = useUnitSystem();
  const [open, setOpen] = useState(false);
  const form = useSetForm('ensemble', props, {
    name: '',
    members: 100 as number | null,
    seed: 1 as number | null,
    cellSize: quickCells(options),
    parameters: options.parameters.map(begin),
  });
  const { members, seed, cellSize, parameters } = form.formik.values;
  const shown = open || form.failure !== null || !form.formik.isValid;
  const cells = options.length / (cellSize && cellSize > 0 ? cellSize : options.cellSize);
  const seconds = estimate(options, [cells]) * ((members ?? 0) + 1);
  const words = parameters.map(({ key, distribution }) => {
    const { label } = options.parameters.find((one) => one.key === key)!;
    return `${label} ${distributionWords(key, distribution, system)}`;
  });
  return (
    <Card title="Ensemble">
      <Txt tone="soft">
        Inputs drawn at random by Latin hypercube sampling (McKay, Beckman and Conover 1979), the
        flood routed for each draw: bands within which 90 of 100 members lie, and the chance that a
        level is exceeded.
      </Txt>
      <FormRoot form={form} label="Ensemble" failedTitle="Not started">
        {shown ? (
          <>
            <FieldRow>
              <FormNumberField name="members" label="Members" hint="20 to 500." />
              <FormNumberField name="seed" label="Seed" hint="Draws the same again." />
            </FieldRow>
            <ParameterRows parameters={options.parameters} begin={begin}>
              {(parameter, path, { distribution }) => (
                <DistributionFields parameter={parameter} path={path} distribution={distribution} />
              )}
            </ParameterRows>
            <CellSizeField options={options} times={(members ?? 0) + 1} />
          </>
        ) : (
          <Txt>
            {`${words.join('; ')}. Seed ${seed}, cells of ${formatChosenLength(cellSize ?? options.cellSize, system)}; ${computingWords(seconds)}.`}
          </Txt>
        )}
        <ButtonRow>
          <FormSubmit kind="outline" label={`Compute ${members || 'the'} members`} />
          {shown ? null : (
            <Button
              kind="quiet"
              label="Change the values"
              name="Change the values of the ensemble"
              onPress={() => setOpen(true)}
            />
          )}
        </ButtonRow>
      </FormRoot>
    </Card>
  );
}

/** Computing that a hundred members may take before larger cells are proposed, s. */
const PATIENCE = 120;

/** Twice or four times the cells of the run where its own would take long; null: its own. */
function quickCells(options: ConfidenceOptions): number | null {
  for (const times of [1, 2, 4])
    if (times === 4 || estimate(options, [options.cells / times]) * 101 <= PATIENCE)
      return times === 1 ? null : Number((options.cellSize * times).toPrecision(3));
  return null;
}
