import { FormNumberField } from '@/components/forms/FormNumberField';
import { useForm } from '@/components/forms/FormRoot';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ConfidenceOptions } from '@/shared/confidence/types';
import { formatChosenLength } from '@/shared/units/format';
import { computingWords, estimate } from '../confidenceWords';

interface Props {
  options: ConfidenceOptions;
  /** How many times the flood is routed. */
  times: number;
}

/** Cells of the members, and what they cost. */
export function CellSizeField({ options, times }: Props) {
  const system = useUnitSystem();
  const wish = useForm().formik.values.cellSize as number | null;
  const cells = wish !== null && wish > 0 ? options.length / wish : options.cells;
  const seconds = estimate(options, [cells]) * times;
  return (
    <FormNumberField
      name="cellSize"
      label="Cell size of the members"
      quantity="length"
      optional
      hint={`The run has ${formatChosenLength(options.cellSize, system)}, which left empty holds here too. Larger cells are quicker and less exact; the result states them. As it stands: ${computingWords(seconds)}.`}
    />
  );
}
