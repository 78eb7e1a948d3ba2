import { useForm } from '@/components/forms/FormRoot';
import { useFormField } from '@/components/forms/useFormField';
import { readTable } from '@/components/queries/scenarios';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { TimeValues } from '@/shared/calibration/types';
import { formatNumber, formatQuantity } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { SeriesEditor } from '../scenarios/SeriesEditor';
import {
  asColumns,
  QUANTITY_OF,
  readTimeTable,
  writeTimeTable,
  type TableQuantity,
} from '../scenarios/timeTable';

interface Props {
  name: 'stage' | 'flow';
  quantity: Extract<TableQuantity, 'flow' | 'stage'>;
  label: string;
}

/** What the gauge recorded against time; a table with dates tells when it begins, too. */
export function RecordField({ name, quantity, label }: Props) {
  const system = useUnitSystem();
  const { formik } = useForm();
  const { value, error, disabled, onChange } = useFormField<TimeValues | null>(name);
  const si = QUANTITY_OF[quantity];
  return (
    <SeriesEditor
      label={label}
      columns={[
        { title: 'time', unit: 'h', show: (time) => formatNumber(time / 3600, 2) },
        {
          title: quantity,
          unit: UNITS[system][si].symbol,
          show: (v) => formatQuantity(v, si, system),
        },
      ]}
      values={[value?.times ?? [], value?.values ?? []]}
      onChange={([times, values], { startsAt }) => {
        onChange(times.length === 0 ? null : { times, values });
        if (startsAt) void formik.setFieldValue('startsAt', startsAt);
      }}
      read={(text) => readTimeTable(text, quantity, system)}
      write={(columns) => writeTimeTable(columns, quantity, system)}
      readFile={async (file) => asColumns(await readTable({ file, quantity, unitSystem: system }))}
      error={error}
      disabled={disabled}
    />
  );
}
