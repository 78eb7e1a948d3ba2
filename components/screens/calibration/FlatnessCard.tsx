import { useMemo } from 'react';
import { CurveSet } from '@/components/charts/CurveSet';
import type { SetCurve } from '@/components/charts/geometry/curveSetModel';
import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Flatness, SearchStretch } from '@/shared/calibration/search/types';
import { formatNumber } from '@/shared/units/format';
import { flatnessWords } from './flatnessWords';
import { stretchName } from './stretchWords';

interface Props {
  stretch: SearchStretch;
  flatness: Flatness;
  best: number;
}

/** The misfit along one multiplier while the others stay at their best. */
export function FlatnessCard({ stretch, flatness, best }: Props) {
  const system = useUnitSystem();
  const { factors, misfit } = flatness;
  const rows = useMemo(
    () => factors.map((factor, i) => ({ factor, misfit: misfit[i] })),
    [factors, misfit],
  );
  const curves = useMemo((): SetCurve[] => {
    const known = rows.filter((row) => row.misfit !== null);
    return [
      {
        name: 'Misfit',
        x: known.map((row) => row.factor),
        y: known.map((row) => row.misfit!),
        look: 1,
      },
    ];
  }, [rows]);
  const name = stretchName(stretch);
  return (
    <Card title={`How sharply ${name} is told`}>
      <CurveSet
        label={`Misfit by the multiplier of ${name}`}
        curves={curves}
        foot="number"
        footName="multiplier of n"
        value="number"
        valueName="misfit, in tolerances"
        unitSystem={system}
        at={best}
        height={180}
      />
      <Txt>{flatnessWords(flatness, best)}</Txt>
      <Table
        label={`Misfit by the multiplier of ${name}`}
        rows={rows}
        rowKey={({ factor }) => factor}
        isChosen={({ factor }) => factor === best}
        columns={[
          {
            key: 'factor',
            title: 'Multiplier',
            unit: '× n',
            render: ({ factor }) => formatNumber(factor, 3),
          },
          {
            key: 'misfit',
            title: 'Misfit',
            align: 'right',
            render: (row) => (row.misfit === null ? 'run failed' : formatNumber(row.misfit, 3)),
          },
        ]}
      />
    </Card>
  );
}
