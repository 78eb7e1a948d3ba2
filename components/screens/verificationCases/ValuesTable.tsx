import type { ComparedQuantity } from '@/components/charts/geometry/comparisonModel';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import type { CaseCurves } from '@/shared/verificationCases/types';
import { formatError, placeText } from '@/shared/verificationCases/words';

interface Props {
  name: string;
  curves: CaseCurves;
  quantity: ComparedQuantity;
}

/** More rows than this are thinned; the file holds them all. */
const ROWS = 60;

interface Row {
  at: number;
  computed: number;
  exact: number;
}

/** Computed beside exact, and their difference. */
export function ValuesTable({ name, curves, quantity }: Props) {
  const { along, at } = curves;
  const { computed, exact } = curves[quantity];
  const unit = quantity === 'stage' ? 'm' : 'm³/s';
  const step = Math.ceil(at.length / ROWS);
  const rows = at
    .map((place, i): Row => ({ at: place, computed: computed[i], exact: exact[i] }))
    .filter((_, i) => i % step === 0);
  const columns: Column<Row>[] = [
    {
      key: 'at',
      title: along === 'time' ? 'After start' : 'Chainage',
      render: (row) => placeText(along, row.at),
    },
    ...(['computed', 'exact'] as const).map((key): Column<Row> => ({
      key,
      title: key === 'computed' ? 'Computed' : 'Exact',
      unit,
      align: 'right',
      render: (row) => row[key].toFixed(quantity === 'stage' ? 4 : 3).replace('-', '−'),
    })),
    {
      key: 'difference',
      title: 'Difference',
      unit,
      align: 'right',
      render: (row) => formatError(row.computed - row.exact).replace('-', '−'),
    },
  ];
  return (
    <>
      <Table label={name} columns={columns} rows={rows} rowKey={(row) => row.at} maxHeight={280} />
      {step > 1 ? (
        <Txt variant="small" tone="soft">
          {`${rows.length} of ${at.length} values. The CSV holds them all.`}
        </Txt>
      ) : null}
    </>
  );
}
