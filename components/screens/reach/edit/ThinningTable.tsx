import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ThinningCost } from '@/shared/reaches/edit/thinPoints';
import { formatNumber } from '@/shared/units/format';
import { fromSi, UNITS, type UnitSystem } from '@/shared/units/units';

type Row = { id: string; cost: ThinningCost };

/** What thinning would cost each section in area below its lower bank, the dearest first. */
export function ThinningTable({ cost }: { cost: readonly Row[] }) {
  const system = useUnitSystem();
  const rows = [...cost].sort((a, b) => Math.abs(b.cost.relative) - Math.abs(a.cost.relative));
  const worst = Math.abs(rows[0].cost.relative);
  return (
    <>
      <Txt tone={worst > 0.02 ? 'ochre' : 'ink'}>
        Area below the lower bank changes by at most {percent(worst)}, in {rows[0].id}.
      </Txt>
      <Table
        label="What thinning costs"
        columns={columns(system)}
        rows={rows}
        rowKey={({ id }) => id}
        maxHeight={200}
      />
    </>
  );
}

const percent = (share: number) => `${formatNumber(100 * share, 2)} %`;

const columns = (system: UnitSystem): Column<Row>[] => [
  { key: 'id', title: 'Section', render: ({ id }) => id },
  { key: 'share', title: 'Area', align: 'right', render: ({ cost }) => percent(cost.relative) },
  {
    key: 'points',
    title: 'Points',
    align: 'right',
    render: ({ cost }) => `${cost.pointsBefore} to ${cost.pointsAfter}`,
  },
  {
    key: 'area',
    title: 'that is',
    unit: UNITS[system].area.symbol,
    align: 'right',
    render: ({ cost }) => formatNumber(fromSi(cost.areaChange, 'area', system), 2),
  },
];
