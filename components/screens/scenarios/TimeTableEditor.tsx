import { useMemo } from 'react';
import { Hydrograph } from '@/components/charts/Hydrograph';
import { readTable } from '@/components/queries/scenarios';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { formatNumber, formatQuantity } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { useEditing } from './editorContext';
import { PlacedField } from './PlacedField';
import { SeriesEditor } from './SeriesEditor';
import {
  asColumns,
  QUANTITY_OF,
  readAs,
  readTimeTable,
  writeTimeTable,
  type TableQuantity,
} from './timeTable';

interface TimeTableEditorProps {
  /** Path of what holds the table, e.g. `upstream`. */
  path: string;
  label: string;
  quantity: TableQuantity;
  times: number[];
  values: number[];
  onChange: (times: number[], values: number[]) => void;
}

/** Flow or stage against time, drawn as it is typed. */
export function TimeTableEditor(props: TimeTableEditorProps) {
  const { path, label, quantity, times, values, onChange } = props;
  const { isLocked } = useEditing();
  const system = useUnitSystem();
  const si = QUANTITY_OF[quantity];
  const series = useMemo(() => ({ times, values }), [times, values]);
  return (
    <PlacedField path={`${path}.values`}>
      {(fault) => (
        <>
          {times.length > 1 ? (
            <Hydrograph label={label} quantity={si} series={series} t={null} unitSystem={system} />
          ) : null}
          <SeriesEditor
            label={label}
            columns={[
              { title: 'time', unit: 'h', show: (time) => formatNumber(time / 3600, 2) },
              {
                title: quantity,
                unit: UNITS[system][si].symbol,
                show: (value) => formatQuantity(value, si, system),
              },
            ]}
            values={[times, values]}
            onChange={([nextTimes, nextValues]) => onChange(nextTimes, nextValues)}
            read={(text) => readTimeTable(text, quantity, system)}
            write={(columns) => writeTimeTable(columns, quantity, system)}
            readFile={async (file) =>
              asColumns(await readTable({ file, quantity: readAs(quantity), unitSystem: system }))
            }
            error={fault}
            disabled={isLocked}
          />
        </>
      )}
    </PlacedField>
  );
}
