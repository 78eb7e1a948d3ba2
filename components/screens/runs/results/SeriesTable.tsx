import { peakOf, type Series } from '@/components/charts/geometry/hydrographModel';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { formatClock, formatQuantity } from '@/shared/units/format';
import { UNITS, type Quantity } from '@/shared/units/units';
import { tableRows } from './tableRows';

interface Props {
  name: string;
  title: string;
  quantity: Quantity;
  series: Series;
  startsAt: string | null;
}

/** More rows than this are thinned; the files hold them all. */
const ROWS = 150;

/** The values behind a curve. */
export function SeriesTable({ name, title, quantity, series, startsAt }: Props) {
  const system = useUnitSystem();
  const count = series.times.length;
  if (!count) return <Txt tone="soft">No values.</Txt>;
  const span = series.times[count - 1] - series.times[0];
  const rows = tableRows(series, ROWS);
  const peak = peakOf(series);
  const columns: Column<(typeof rows)[number]>[] = [
    { key: 'time', title: 'After start', render: ({ time }) => shortTime(time, span) },
    ...(startsAt
      ? [
          {
            key: 'clock',
            title: 'Clock',
            render: ({ time }: { time: number }) => formatClock(startsAt, time),
          },
        ]
      : []),
    {
      key: 'value',
      title,
      unit: UNITS[system][quantity].symbol,
      align: 'right',
      render: ({ value }) => formatQuantity(value, quantity, system),
    },
  ];
  return (
    <>
      <Table
        label={name}
        columns={columns}
        rows={rows}
        rowKey={({ time }) => time}
        isChosen={({ time }) => time === peak?.time}
        maxHeight={280}
      />
      <Txt variant="small" tone="soft">
        {rows.length < count
          ? `${rows.length} of ${count} output times, the highest marked. The CSV holds them all.`
          : 'The highest is marked.'}
      </Txt>
    </>
  );
}
