import { shortTime } from '@/components/charts/geometry/timeWords';
import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { IssuedStation } from '@/shared/review/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';

interface Props {
  stations: IssuedStation[];
  chosen: number;
  onChoose: (chainage: number) => void;
  guideline: string;
}

/** All chosen places side by side. */
export function IssuedTable({ stations, chosen, onChoose, guideline }: Props) {
  const system = useUnitSystem();
  return (
    <Card title="All places">
      <Table
        label="All places"
        columns={columns(system)}
        rows={stations}
        rowKey={({ stationId }) => stationId}
        isChosen={({ stationId }) => stationId === chosen}
        onRowPress={({ chainage }) => onChoose(chainage)}
      />
      <Txt variant="small" tone="soft">{`Hazard class by depth and velocity, ${guideline}.`}</Txt>
    </Card>
  );
}

function columns(system: UnitSystem): Column<IssuedStation>[] {
  const unit = UNITS[system];
  const time = ({ times }: IssuedStation, t: number | null) =>
    t === null ? 'never' : shortTime(t, times[times.length - 1] - times[0]);
  return [
    {
      key: 'place',
      title: 'Place',
      render: ({ name, chainage }) => `${name}, ${formatWithUnit(chainage, 'chainage', system)}`,
    },
    {
      key: 'stage',
      title: 'Peak stage',
      unit: unit.elevation.symbol,
      align: 'right',
      render: ({ peakStage }) => formatQuantity(peakStage, 'elevation', system),
    },
    {
      key: 'flow',
      title: 'Peak flow',
      unit: unit.flow.symbol,
      align: 'right',
      render: ({ peakFlow }) => formatQuantity(peakFlow, 'flow', system),
    },
    {
      key: 'arrives',
      title: 'Arrives',
      align: 'right',
      render: (station) => time(station, station.arrival),
    },
    {
      key: 'peakAt',
      title: 'Highest at',
      align: 'right',
      render: (station) => time(station, station.peakStageTime),
    },
    {
      key: 'hazard',
      title: 'Hazard',
      align: 'right',
      render: ({ hazard }) => hazard?.label ?? 'dry',
    },
  ];
}
