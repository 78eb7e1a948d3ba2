import { useUnitSystem } from '@/components/ui/unitSystem';
import { formatQuantity } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { readColumns, writeColumns, type TextColumn } from './columnsText';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { SeriesEditor } from './SeriesEditor';

interface ColumnTableEditorProps {
  /** Path of what holds the table, e.g. `downstream`. */
  path: string;
  label: string;
  columns: readonly TextColumn[];
  /** One array a column, SI. */
  values: readonly number[][];
  onChange: (values: number[][]) => void;
}

/** A table of plain columns: a rating curve, a profile. */
export function ColumnTableEditor({
  path,
  label,
  columns,
  values,
  onChange,
}: ColumnTableEditorProps) {
  const { isLocked } = useEditing();
  const system = useUnitSystem();
  return (
    <PlacedField path={`${path}.values`}>
      {(fault) => (
        <SeriesEditor
          label={label}
          columns={columns.map(({ title, quantity }) => ({
            title,
            unit: UNITS[system][quantity].symbol,
            show: (value) => formatQuantity(value, quantity, system),
          }))}
          values={values}
          onChange={onChange}
          read={(text) => readColumns(text, columns, system)}
          write={(stored) => writeColumns(stored, columns, system)}
          error={fault}
          disabled={isLocked}
        />
      )}
    </PlacedField>
  );
}
