import { useState } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { usePlace } from '@/components/charts/usePlaceAndTime';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { PlacePeaks, RunSummary } from '@/shared/runs/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { sayIn } from '@/shared/units/message';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { attenuationFigure } from '../runWords';

interface Props {
  summary: RunSummary;
  store: PlaceAndTimeStore;
}

type Row = PlacePeaks & { name: string };

/** Peaks, arrival and attenuation: the stations first, all surveyed sections one press away. */
export function PeaksCard({ summary, store }: Props) {
  const unitSystem = useUnitSystem();
  const at = usePlace(store);
  const { stations, sections, times, arrivalRule } = summary;
  const [all, setAll] = useState(stations.length === 0);
  const rows: Row[] = all
    ? sections.map((section) => ({ ...section, name: section.id }))
    : stations;
  return (
    <Card
      title={all ? 'Peaks at all sections' : 'Peaks at the stations'}
      aside={
        stations.length ? (
          <Button
            kind="quiet"
            label={all ? 'Stations only' : 'All sections'}
            onPress={() => setAll(!all)}
          />
        ) : undefined
      }
    >
      <Table
        label={all ? 'Peaks at all sections' : 'Peaks at the stations'}
        columns={columns(unitSystem, times.end - times.start)}
        rows={rows}
        rowKey={({ chainage, name }) => `${chainage} ${name}`}
        isChosen={({ chainage }) => chainage === at}
        onRowPress={({ chainage }) => store.setAt(chainage)}
        maxHeight={420}
      />
      <Txt variant="small" tone="soft">
        {sayIn(unitSystem, arrivalRule)}
      </Txt>
    </Card>
  );
}

function columns(system: UnitSystem, span: number): Column<Row>[] {
  const unit = UNITS[system];
  const time = (seconds: number | null) => (seconds === null ? 'never' : shortTime(seconds, span));
  return [
    {
      key: 'place',
      title: 'Place',
      render: ({ name, chainage }) => `${name}, ${formatWithUnit(chainage, 'chainage', system)}`,
    },
    {
      key: 'stage',
      title: 'Stage',
      unit: unit.elevation.symbol,
      align: 'right',
      render: ({ peakStage }) => formatQuantity(peakStage, 'elevation', system),
    },
    {
      key: 'flow',
      title: 'Flow',
      unit: unit.flow.symbol,
      align: 'right',
      render: ({ peakFlow }) => formatQuantity(peakFlow, 'flow', system),
    },
    { key: 'arrives', title: 'Arrives', align: 'right', render: ({ arrival }) => time(arrival) },
    {
      key: 'peakAt',
      title: 'Peak at',
      align: 'right',
      render: ({ peakStageTime }) => time(peakStageTime),
    },
    {
      key: 'depth',
      title: 'Depth',
      unit: unit.depth.symbol,
      align: 'right',
      render: ({ peakDepth }) => formatQuantity(peakDepth, 'depth', system),
    },
    {
      key: 'velocity',
      title: 'Velocity',
      unit: unit.velocity.symbol,
      align: 'right',
      render: ({ peakVelocity }) => formatQuantity(peakVelocity, 'velocity', system),
    },
    {
      key: 'attenuation',
      title: 'Attenuation',
      unit: '%',
      align: 'right',
      render: attenuationFigure,
    },
  ];
}
