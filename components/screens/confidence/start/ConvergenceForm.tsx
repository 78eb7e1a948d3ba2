import { FormRadioGroup } from '@/components/forms/FormRadioGroup';
import { FormRoot } from '@/components/forms/FormRoot';
import { FormSubmit } from '@/components/forms/FormSubmit';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { formatChosenLength } from '@/shared/units/format';
import { computingWords, estimate } from '../confidenceWords';
import { useSetForm, type SetFormProps } from './useSetForm';

/** Three grids. */
export function ConvergenceForm(props: SetFormProps) {
  const form = useSetForm('convergence', props, { name: '', finest: 'same' });
  const system = useUnitSystem();
  const { cells, length } = props.options;
  const grids = (finest: number) => [finest, finest / 2, finest / 4];
  const choice = (value: 'same' | 'half', label: string, finest: number) => {
    const sizes = grids(finest).map((count) =>
      formatChosenLength(length / Math.round(count), system),
    );
    const seconds = estimate(props.options, grids(finest));
    return {
      value,
      label,
      hint: `Cells of ${sizes.join(', ')}; ${computingWords(seconds)}.`,
    };
  };
  return (
    <Card title="Cell-size convergence">
      <Txt tone="soft">
        The same flood on three grids, each with half the cells of the one before. The observed
        order and the grid convergence index (Roache 1994) tell what the cells cost in stage, flow
        and arrival.
      </Txt>
      <FormRoot form={form} label="Cell-size convergence" failedTitle="Not started">
        <FormRadioGroup
          name="finest"
          label="Finest grid"
          options={[
            choice('same', 'The cells of the run', cells),
            choice('half', 'Half the cells of the run', 2 * cells),
          ]}
        />
        <FormSubmit kind="outline" label="Compute three grids" />
      </FormRoot>
    </Card>
  );
}
