import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { SearchResult } from '@/shared/calibration/search/types';
import {
  formatDuration,
  formatNumber,
  formatQuantity,
  formatWithUnit,
} from '@/shared/units/format';
import { signed } from './floodWords';

type Compared = SearchResult['before'];

interface Row {
  name: string;
  before: string;
  after: string;
}

/** The residuals with multipliers of 1 and with the best ones, on the same cells. */
export function BeforeAfterCard({ before, after }: { before: Compared; after: Compared }) {
  const system = useUnitSystem();
  const length = (value: number | null | undefined) =>
    value == null ? '–' : signed(formatQuantity(value, 'depth', system), value);
  const row = (name: string, of: (compared: Compared) => string): Row => ({
    name,
    before: of(before),
    after: of(after),
  });
  const rows: Row[] = [
    row('Misfit', ({ misfit }) => (misfit === null ? '–' : formatNumber(misfit, 2))),
    ...(before.all
      ? [
          row('Marks, mean', ({ all }) => length(all?.mean)),
          row('Marks, RMS', ({ all }) => length(all?.rms).replace('+', '')),
          row('Within tolerance', ({ all }) => (all ? `${all.within} of ${all.count}` : '–')),
        ]
      : []),
    ...before.gauges.flatMap(({ name, quantity }, i) => [
      row(`${name}, ${quantity}, efficiency`, ({ gauges }) => {
        const found = gauges[i].figures?.efficiency;
        return found == null ? '–' : formatNumber(found, 3);
      }),
      row(`${name}, ${quantity}, peak late by`, ({ gauges }) => {
        const peak = gauges[i].figures?.peak;
        return peak ? formatDuration(peak.delay) : '–';
      }),
    ]),
  ];
  const marks = before.marks.map((mark, i): Row => ({
    name: `Mark at ${formatWithUnit(mark.mark.chainage, 'chainage', system)}`,
    before: length(mark.residual),
    after: length(after.marks[i].residual),
  }));
  return (
    <Card title="Before and after">
      <Table
        label="Before and after"
        rows={[...rows, ...marks]}
        rowKey={({ name }) => name}
        maxHeight={480}
        columns={[
          { key: 'name', title: 'Residuals', render: ({ name }) => name },
          { key: 'before', title: 'Before', align: 'right', render: (shown) => shown.before },
          { key: 'after', title: 'After', align: 'right', render: (shown) => shown.after },
        ]}
      />
    </Card>
  );
}
