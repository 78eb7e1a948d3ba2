import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace } from '@/components/charts/usePlaceAndTime';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { LevelResult } from '@/shared/runs/levelResult';
import type { RunSummary } from '@/shared/runs/types';
import { levelName } from '@/shared/studies/stationLevels';
import { formatDuration, formatQuantity } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';

interface Props {
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

/** Freeboard of the soffits, floors and roads that were named at the stations. */
export function LevelsCard({ summary, store }: Props) {
  const system = useUnitSystem();
  const at = usePlace(store);
  const { levels, times } = summary;
  const passed = levels.filter(({ freeboard }) => freeboard < 0).length;
  return (
    <Card
      title="Levels at the stations"
      aside={passed ? `${passed} of ${levels.length} passed` : 'none passed'}
    >
      <Table
        label="Levels at the stations"
        columns={columns(system, times.end - times.start)}
        rows={levels.map((result, k) => ({ ...result, k }))}
        rowKey={({ k }) => k}
        isChosen={({ chainage }) => chainage === at}
        onRowPress={({ chainage }) => store.setAt(chainage)}
        maxHeight={420}
      />
      <Txt variant="small" tone="soft">
        Freeboard is the level less the peak stage of every time step; below zero the water stands
        above the level. Times are from the stored moments. The computed surface is level across the
        section: at a bridge or a house the water can stand higher.
      </Txt>
    </Card>
  );
}

function columns(system: UnitSystem, span: number): Column<LevelResult & { k: number }>[] {
  const unit = UNITS[system];
  return [
    { key: 'what', title: 'Where and what', render: (row) => `${row.name}: ${levelName(row)}` },
    {
      key: 'level',
      title: 'Level',
      unit: unit.elevation.symbol,
      align: 'right',
      render: ({ level }) => formatQuantity(level, 'elevation', system),
    },
    {
      key: 'stage',
      title: 'Peak stage',
      unit: unit.elevation.symbol,
      align: 'right',
      render: ({ peakStage }) => formatQuantity(peakStage, 'elevation', system),
    },
    {
      key: 'freeboard',
      title: 'Freeboard',
      unit: unit.depth.symbol,
      align: 'right',
      render: ({ freeboard }) => formatQuantity(freeboard, 'depth', system),
    },
    {
      key: 'passedAt',
      title: 'Passed at',
      align: 'right',
      render: ({ passedAt }) => (passedAt === null ? 'never' : shortTime(passedAt, span)),
    },
    {
      key: 'passedFor',
      title: 'Passed for',
      align: 'right',
      render: ({ passedAt, passedFor }) => (passedAt === null ? '–' : formatDuration(passedFor)),
    },
  ];
}
