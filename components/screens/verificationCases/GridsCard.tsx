import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { NORMS, type GridErrors } from '@/shared/verificationCases/types';
import { formatError, formatOrder, NORM_WORDS } from '@/shared/verificationCases/words';

const norms = (quantity: 'stage' | 'flow', unit: string): Column<GridErrors>[] => [
  ...NORMS.map((norm): Column<GridErrors> => ({
    key: `${quantity} ${norm}`,
    title: `${quantity === 'stage' ? 'Stage' : 'Flow'} ${NORM_WORDS[norm]}`,
    unit,
    align: 'right',
    render: (grid) => formatError(grid[quantity][norm]),
  })),
  {
    key: `${quantity} order`,
    title: 'Order',
    align: 'right',
    render: (grid) => formatOrder(quantity === 'stage' ? grid.stageOrder : grid.flowOrder),
  },
];

const COLUMNS: Column<GridErrors>[] = [
  {
    key: 'cells',
    title: 'Cells',
    render: ({ cells, cellSize }) => `${cells} of ${Number(cellSize.toPrecision(3))} m`,
  },
  ...norms('stage', 'm'),
  ...norms('flow', 'm³/s'),
  {
    key: 'seconds',
    title: 'Computing',
    unit: 's',
    align: 'right',
    render: ({ seconds }) => seconds.toFixed(2),
  },
];

/** Errors on every grid and the order at which they fall. */
export function GridsCard({ grids }: { grids: readonly GridErrors[] }) {
  return (
    <Card title="Grids and order">
      <Table label="Errors by grid" columns={COLUMNS} rows={grids} rowKey={({ cells }) => cells} />
      <Txt variant="small" tone="soft">
        L1 is the mean of the differences, L2 the root of their mean square, L∞ the largest. Order:
        the power of the cell size by which the L1 difference falls from the grid above; none where
        only rounding is left.
      </Txt>
    </Card>
  );
}
