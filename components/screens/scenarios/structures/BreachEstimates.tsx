import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { peakEstimates, type PeakEstimate } from '@/shared/breach/breachEstimates';
import { damInputsOf } from '@/shared/scenarios/structures/damData';
import { formatNumber } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { bandOf, estimateRows, timeBand, type EstimateRow } from './estimateRows';
import { useStructure } from './structureContext';

/** What each published set of regressions makes of the dam, side by side; one press takes it over. */
export function BreachEstimates() {
  const { structure, change, disabled } = useStructure('breach');
  const system = useUnitSystem();
  const [peaksShown, showPeaks] = useState(false);
  const inputs = damInputsOf(structure);
  if (!inputs)
    return (
      <Txt tone="soft">
        What the published regressions give is listed here as soon as the crest, the bottom of the
        breach, and depth and volume of the water are there.
      </Txt>
    );
  const take = disabled ? undefined : (row: EstimateRow) => row.taken && change(row.taken);
  const name = `Breach of ${structure.id} by published regressions`;
  return (
    <>
      <Table
        label={name}
        columns={columns(system, structure.estimate, take)}
        rows={estimateRows(inputs, structure.sideSlope)}
        rowKey={({ id }) => id}
        isChosen={({ id }) => id === structure.estimate}
      />
      <Txt variant="small" tone="soft">
        In brackets the band that held 95 of 100 past failures (Wahl 2001); Froehlich 2008 is not in
        that study. Past dams scatter by a factor of two and more: try several, and say why you
        choose one.
      </Txt>
      <Button
        kind="quiet"
        label={peaksShown ? 'Hide the peak flows' : 'Show published peak flows'}
        name={`${peaksShown ? 'Hide the peak flows' : 'Show published peak flows'}: ${structure.id}`}
        onPress={() => showPeaks(!peaksShown)}
      />
      {peaksShown ? (
        <Table
          label={`Peak flow at ${structure.id} by published regressions`}
          columns={peakColumns(system)}
          rows={peakEstimates(inputs)}
          rowKey={({ id }) => id}
          maxHeight={320}
        />
      ) : null}
    </>
  );
}

function columns(
  system: UnitSystem,
  estimate: string,
  take: ((row: EstimateRow) => void) | undefined,
): Column<EstimateRow>[] {
  return [
    { key: 'name', title: 'Regression', render: ({ name }) => name },
    ...(take
      ? [
          {
            key: 'take',
            title: 'Use',
            render: (row: EstimateRow) =>
              row.id === estimate ? (
                'Taken'
              ) : (
                <Button
                  kind="quiet"
                  label="Take"
                  name={`Take ${row.name}`}
                  disabled={!row.taken}
                  onPress={() => take(row)}
                />
              ),
          },
        ]
      : []),
    {
      key: 'width',
      title: 'Average width',
      unit: UNITS[system].length.symbol,
      align: 'right',
      render: ({ width }) => bandOf(width, 'length', system),
    },
    {
      key: 'time',
      title: 'Formation time',
      align: 'right',
      render: ({ formationTime }) => timeBand(formationTime),
    },
    {
      key: 'slope',
      title: 'Side slope',
      align: 'right',
      render: ({ sideSlope }) => (sideSlope === null ? 'none given' : formatNumber(sideSlope, 1)),
    },
    { key: 'source', title: 'Source', render: ({ source }) => source },
  ];
}

const peakColumns = (system: UnitSystem): Column<PeakEstimate>[] => [
  { key: 'name', title: 'Regression', render: ({ name }) => name },
  {
    key: 'flow',
    title: 'Peak flow',
    unit: UNITS[system].flow.symbol,
    align: 'right',
    render: (estimate) => bandOf(estimate, 'flow', system),
  },
  { key: 'source', title: 'Source', render: ({ source }) => source },
];
