import { useState } from 'react';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import type { GaugeRow } from '@/shared/calibration/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { clockToText } from '../scenarios/startClock';
import { floodName } from './floodWords';
import { GaugeDialog } from './GaugeDialog';

/** Records of gauges: how long they are, and how high the water came. */
export function GaugesCard({ gauges }: { gauges: GaugeRow[] }) {
  const { study, may } = useCurrentStudy();
  const [changing, setChanging] = useState<GaugeRow | null>(null);
  const system = study.unitSystem;
  const mayChange = may('scenario.change');
  const value = (si: number | null, quantity: 'elevation' | 'flow') =>
    si === null ? '–' : formatQuantity(si, quantity, system);
  return (
    <Card title="Gauge records" aside={String(gauges.length)}>
      <Table
        label="Gauge records"
        rows={gauges}
        rowKey={({ id }) => id}
        onRowPress={mayChange ? setChanging : undefined}
        columns={[
          {
            key: 'name',
            title: 'Gauge',
            render: ({ name, chainage }) =>
              `${name}, ${formatWithUnit(chainage, 'chainage', system)}`,
          },
          { key: 'flood', title: 'Flood', render: ({ flood }) => floodName(flood) },
          {
            key: 'starts',
            title: 'Begins',
            render: ({ startsAt }) => (startsAt ? clockToText(startsAt) : 'with the run'),
          },
          {
            key: 'count',
            title: 'Values',
            align: 'right',
            render: ({ stageCount, flowCount }) => String(Math.max(stageCount, flowCount)),
          },
          {
            key: 'stage',
            title: 'Peak stage',
            unit: UNITS[system].elevation.symbol,
            align: 'right',
            render: ({ peakStage }) => value(peakStage, 'elevation'),
          },
          {
            key: 'flow',
            title: 'Peak flow',
            unit: UNITS[system].flow.symbol,
            align: 'right',
            render: ({ peakFlow }) => value(peakFlow, 'flow'),
          },
        ]}
      />
      {mayChange ? (
        <Txt variant="small" tone="soft">
          Choose one to look at it, change or remove it.
        </Txt>
      ) : null}
      {changing ? (
        <GaugeDialog
          gauge={changing}
          floods={gauges.map(({ flood }) => flood)}
          at={null}
          onClose={() => setChanging(null)}
        />
      ) : null}
    </Card>
  );
}
