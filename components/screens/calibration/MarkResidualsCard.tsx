import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { CONFIDENCE_WORDS, KIND_WORDS } from '@/shared/calibration/marks';
import type { MarkResidual } from '@/shared/calibration/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { signed } from './floodWords';

/** Each mark with what was computed there. */
export function MarkResidualsCard({ marks }: { marks: MarkResidual[] }) {
  const system = useUnitSystem();
  const { at, setAt } = usePlaceAndTime();
  const unit = UNITS[system].elevation.symbol;
  return (
    <Card title="Residuals of the marks" aside={String(marks.length)}>
      <Table
        label="Residuals of the marks"
        rows={marks}
        rowKey={({ mark }) => mark.id}
        isChosen={({ mark }) => mark.chainage === at}
        onRowPress={({ mark }) => setAt(mark.chainage)}
        maxHeight={460}
        columns={[
          {
            key: 'place',
            title: 'Chainage',
            render: ({ mark }) => formatWithUnit(mark.chainage, 'chainage', system),
          },
          {
            key: 'residual',
            title: 'Residual',
            unit,
            align: 'right',
            render: (row) => residualText(row, system),
          },
          {
            key: 'observed',
            title: 'Observed',
            unit,
            align: 'right',
            render: ({ mark }) => formatQuantity(mark.level, 'elevation', system),
          },
          {
            key: 'computed',
            title: 'Computed',
            unit,
            align: 'right',
            render: ({ computed }) =>
              computed === null ? '–' : formatQuantity(computed, 'elevation', system),
          },
          {
            key: 'tolerance',
            title: 'Tolerance',
            unit,
            align: 'right',
            render: ({ tolerance }) => `±${formatQuantity(tolerance, 'depth', system)}`,
          },
          { key: 'within', title: 'Within it', render: withinText },
          {
            key: 'kind',
            title: 'Kind',
            render: ({ mark }) =>
              `${KIND_WORDS[mark.kind]}, ${CONFIDENCE_WORDS[mark.confidence].toLowerCase()}`,
          },
          { key: 'note', title: 'Note', render: ({ mark }) => mark.note || '–' },
        ]}
      />
    </Card>
  );
}

const WHY = { offReach: 'off the reach', dry: 'dry in the run' };

function residualText({ residual, why }: MarkResidual, system: UnitSystem): string {
  if (residual === null) return why ? WHY[why] : '–';
  return signed(formatQuantity(residual, 'depth', system), residual);
}

const withinText = ({ residual, tolerance }: MarkResidual) =>
  residual === null ? '–' : Math.abs(residual) <= tolerance + 1e-9 ? 'yes' : 'no';
