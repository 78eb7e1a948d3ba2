import { useState } from 'react';
import { Card } from '@/components/ui/Card';
import { FigureWithUnit } from '@/components/ui/FigureWithUnit';
import { NumberField } from '@/components/ui/NumberField';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { exceedance } from '@/shared/confidence/exceedance';
import { bandOf } from '@/shared/confidence/quantile';
import type { EnsembleStation } from '@/shared/confidence/types';
import { formatNumber, formatWithUnit } from '@/shared/units/format';

/** How likely the peak stands above a level: a road, a threshold, a bank. */
export function ExceedanceCard({ station }: { station: EnsembleStation }) {
  const system = useUnitSystem();
  const { p50 } = bandOf(station.peakStages);
  const [level, setLevel] = useState<number | null>(Number(p50.toFixed(1)));
  const { above, of } = exceedance(station.peakStages, level ?? NaN);
  const known = level !== null && Number.isFinite(level);
  return (
    <Card title={`Chance of standing above a level at ${station.name}`}>
      <NumberField
        label="Level above the datum"
        quantity="elevation"
        hint="E.g. of a road, a threshold or a bank."
        value={level}
        onChange={setLevel}
      />
      {known ? (
        <FigureWithUnit
          value={formatNumber((100 * above) / of, 0)}
          unit="%"
          label={`${above} of ${of} members stand above ${formatWithUnit(level, 'elevation', system)}`}
        />
      ) : (
        <Txt tone="soft">Write a level.</Txt>
      )}
      <Txt variant="small" tone="soft">
        Given that this flood comes, with the inputs spread as they were. It is not the chance of
        the flood itself, and {of} members tell nothing finer than {formatNumber(100 / of, 1)} %.
      </Txt>
    </Card>
  );
}
