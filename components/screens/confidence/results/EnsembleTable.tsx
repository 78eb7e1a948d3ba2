import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { bandOf } from '@/shared/confidence/quantile';
import type { EnsembleResult, EnsembleStation, PlaceValues } from '@/shared/confidence/types';
import { formatChosenLength } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';
import { VALUE_NAMES, valueText } from '@/shared/confidence/placeValueWords';

interface Row {
  station: string;
  quantity: keyof PlaceValues;
  base: number | null | undefined;
  values: number[];
}

/** Percentiles of peaks and arrival at the stations. */
export function EnsembleTable({ result }: { result: EnsembleResult }) {
  const system = useUnitSystem();
  const { cellSize, failed, members, stations } = result;
  return (
    <Card title="At the stations">
      <Table
        label="Percentiles at the stations"
        columns={columns(system)}
        rows={stations.flatMap(rowsOf)}
        rowKey={({ station, quantity }) => `${station} ${quantity}`}
        maxHeight={520}
      />
      <Txt variant="small" tone="soft">
        {`Of ${members} members${failed ? `; ${failed} failed and are left out` : ''}. The base case is that of the run on the cells of the members, ${formatChosenLength(cellSize, system)}: what differs from the run itself is the cost of these cells. A member that the wave never reaches counts as later than any other.`}
      </Txt>
    </Card>
  );
}

const rowsOf = ({ name, base, peakStages, peakFlows, arrivals }: EnsembleStation): Row[] => [
  { station: name, quantity: 'peakStage', base: base?.peakStage, values: peakStages },
  { station: name, quantity: 'peakFlow', base: base?.peakFlow, values: peakFlows },
  {
    station: name,
    quantity: 'arrival',
    base: base?.arrival,
    values: arrivals.map((arrival) => arrival ?? Infinity),
  },
];

function columns(system: UnitSystem): Column<Row>[] {
  const share = (key: 'p5' | 'p50' | 'p95', title: string): Column<Row> => ({
    key,
    title,
    align: 'right',
    render: ({ quantity, values }) => valueText(quantity, bandOf(values)[key], system),
  });
  return [
    { key: 'station', title: 'Station', render: ({ station }) => station },
    { key: 'value', title: 'Value', render: ({ quantity }) => VALUE_NAMES[quantity] },
    {
      key: 'base',
      title: 'Base case',
      align: 'right',
      render: ({ quantity, base }) =>
        base === undefined ? 'failed' : valueText(quantity, base, system),
    },
    share('p5', '5 %'),
    share('p50', '50 %'),
    share('p95', '95 %'),
  ];
}
