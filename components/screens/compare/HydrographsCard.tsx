import { useMemo } from 'react';
import { CurveSet } from '@/components/charts/CurveSet';
import type { SetCurve } from '@/components/charts/geometry/curveSetModel';
import { usePlaceAndTime } from '@/components/charts/usePlaceAndTime';
import { useSeriesOfRuns } from '@/components/queries/runs';
import { Card } from '@/components/ui/Card';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { ComparedRun, RunComparison } from '@/shared/comparison/types';
import { formatWithUnit } from '@/shared/units/format';
import { placeNear } from './placeNear';
import { runName } from './runName';

/** Stage and flow of each run at the chosen place. */
export function HydrographsCard({ comparison }: { comparison: RunComparison }) {
  const system = useUnitSystem();
  const { at } = usePlaceAndTime();
  const place = placeNear(comparison.places, at);
  const where = `${place.name}, ${formatWithUnit(place.chainage, 'chainage', system)}`;
  return (
    <>
      <OfPlace quantity="stage" where={where} chainage={place.chainage} runs={comparison.runs} />
      <OfPlace quantity="flow" where={where} chainage={place.chainage} runs={comparison.runs} />
    </>
  );
}

interface Props {
  quantity: 'stage' | 'flow';
  where: string;
  chainage: number;
  runs: ComparedRun[];
}

function OfPlace({ quantity, where, chainage, runs }: Props) {
  const system = useUnitSystem();
  const { t, setT } = usePlaceAndTime();
  const { series, isPending } = useSeriesOfRuns(
    runs.map(({ id }) => id),
    chainage,
  );
  const curves = useMemo(
    () =>
      series.flatMap((one, i): SetCurve[] =>
        one ? [{ name: runName(runs[i]), x: one.times, y: one[quantity], look: i }] : [],
      ),
    [series, runs, quantity],
  );
  const title = quantity === 'stage' ? 'Stage' : 'Flow';
  return (
    <Card title={`${title} at ${where}`}>
      {curves.length > 0 ? (
        <CurveSet
          label={`${title} at ${where}`}
          curves={curves}
          foot="time"
          value={quantity === 'stage' ? 'elevation' : 'flow'}
          unitSystem={system}
          at={t}
          onChange={setT}
          height={220}
        />
      ) : isPending ? (
        <Loading what="Reading the values at this place…" />
      ) : (
        <Txt tone="soft">No run has this place on its reach.</Txt>
      )}
      {curves.length > 0 && curves.length < runs.length && !isPending ? (
        <Txt variant="small" tone="soft">
          The other runs do not have this place on their reach.
        </Txt>
      ) : null}
    </Card>
  );
}
