import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { GridConvergence } from '@/shared/confidence/gridConvergence';
import type { ConvergenceResult, GridRow } from '@/shared/confidence/types';
import { formatChosenLength, formatNumber } from '@/shared/units/format';
import { fromSi, UNITS, type UnitSystem } from '@/shared/units/units';

interface Row extends GridRow {
  place: string;
  quantity: 'peakStage' | 'peakFlow' | 'arrival';
}

const KINDS: Record<GridConvergence['kind'], string> = {
  monotone: 'from one side',
  oscillating: 'to and fro',
  unchanged: 'no difference',
  diverging: 'none',
};

/** Stage, flow and arrival of the stations on the three grids, with order and index. */
export function ConvergenceTable({ result }: { result: ConvergenceResult }) {
  const system = useUnitSystem();
  const rows = result.stations.flatMap(({ name, peakStage, peakFlow, arrival }): Row[] => [
    { place: name, quantity: 'peakStage', ...peakStage },
    { place: name, quantity: 'peakFlow', ...peakFlow },
    { place: name, quantity: 'arrival', ...arrival },
  ]);
  return (
    <Card title="At the stations">
      <Table
        label="Convergence at the stations"
        columns={columns(result, system)}
        rows={rows}
        rowKey={({ place, quantity }) => `${place} ${quantity}`}
        maxHeight={520}
      />
      <Txt variant="small" tone="soft">
        {
          'The band is the grid convergence index of the finest grid with a factor of safety of 1.25 (Roache 1994; Celik and others 2008), in the unit of the value. Where the values go to and fro it is a rough guide only.'
        }
      </Txt>
    </Card>
  );
}

function columns({ grids }: ConvergenceResult, system: UnitSystem): Column<Row>[] {
  const unit = UNITS[system];
  const named = {
    peakStage: `peak stage, ${unit.elevation.symbol}`,
    peakFlow: `peak flow, ${unit.flow.symbol}`,
    arrival: 'arrival, min',
  };
  const value = ({ quantity }: Row, si: number | null, more = 1): string => {
    if (si === null) return '–';
    if (quantity === 'arrival') return formatNumber(si / 60, more);
    const as = quantity === 'peakStage' ? 'elevation' : 'flow';
    return formatNumber(fromSi(si, as, system), unit[as].decimals + more);
  };
  const size = (cellSize: number | null) =>
    cellSize === null ? 'Failed' : `On ${formatChosenLength(cellSize, system)}`;
  return [
    { key: 'place', title: 'Place', render: ({ place }) => place },
    { key: 'what', title: 'Value', render: ({ quantity }) => named[quantity] },
    ...grids.map(({ cellSize }, k): Column<Row> => ({
      key: `grid ${k}`,
      title: size(cellSize),
      align: 'right',
      render: (row) => value(row, row.values[k]),
    })),
    {
      key: 'order',
      title: 'Order',
      align: 'right',
      render: ({ convergence }) =>
        convergence?.order == null ? '–' : formatNumber(convergence.order, 1),
    },
    {
      key: 'extrapolated',
      title: 'Tends to',
      align: 'right',
      render: (row) => value(row, row.convergence?.extrapolated ?? null),
    },
    {
      key: 'band',
      title: 'Band',
      align: 'right',
      render: (row) => (row.band === null ? '–' : `± ${value(row, row.band, 2)}`),
    },
    {
      key: 'kind',
      title: 'Convergence',
      render: ({ convergence }) => (convergence ? KINDS[convergence.kind] : 'not all grids'),
    },
  ];
}
