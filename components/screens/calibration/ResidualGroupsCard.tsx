import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { CONFIDENCE_WORDS, KIND_WORDS, MARK_TOLERANCE } from '@/shared/calibration/marks';
import type { ResidualSummary, RunResiduals } from '@/shared/calibration/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { signed } from './floodWords';

interface Group {
  name: string;
  summary: ResidualSummary;
}

/** The same figures by confidence and by kind: one bad sort of mark shows itself. */
export function ResidualGroupsCard({ residuals }: { residuals: RunResiduals }) {
  const system = useUnitSystem();
  const { byConfidence, byKind, all } = residuals;
  const length = (value: number) => formatQuantity(value, 'depth', system);
  const groups: Group[] = [
    ...byConfidence.map(({ confidence, summary }) => ({
      name: `${CONFIDENCE_WORDS[confidence]}, ±${formatWithUnit(MARK_TOLERANCE[confidence], 'depth', system)}`,
      summary,
    })),
    ...byKind.map(({ kind, summary }) => ({ name: KIND_WORDS[kind], summary })),
  ];
  const unit = UNITS[system].depth.symbol;
  return (
    <Card title="By confidence and kind">
      {all ? (
        <Table
          label="Residuals by confidence and kind"
          rows={groups}
          rowKey={({ name }) => name}
          columns={[
            { key: 'name', title: 'Marks', render: ({ name }) => name },
            {
              key: 'mean',
              title: 'Mean',
              unit,
              align: 'right',
              render: ({ summary: { mean } }) => signed(length(mean), mean),
            },
            {
              key: 'rms',
              title: 'RMS',
              unit,
              align: 'right',
              render: ({ summary }) => length(summary.rms),
            },
            {
              key: 'within',
              title: 'Within',
              align: 'right',
              render: ({ summary: { within, count } }) => `${within} of ${count}`,
            },
          ]}
        />
      ) : (
        <Txt tone="soft">No mark of this flood can be compared.</Txt>
      )}
    </Card>
  );
}
