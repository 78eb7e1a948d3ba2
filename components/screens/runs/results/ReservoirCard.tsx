import { useMemo } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { shortTime } from '@/components/charts/geometry/timeWords';
import { useRunReservoir } from '@/components/queries/runs';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunReservoir, RunReservoirSeries, RunSummary } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import { Facts } from '../Facts';
import { SeriesCard } from './SeriesCard';

interface Props {
  run: Run;
  summary: RunSummary;
  reservoir: RunReservoir;
  store: PlaceAndTimeStore;
}

/** The level pool at the head: how it filled or emptied. */
export function ReservoirCard({ run, summary, reservoir, store }: Props) {
  const system = useUnitSystem();
  const { data, error, refetch } = useRunReservoir(run.id);
  const { start, end } = summary.times;
  const at = (t: number) => shortTime(t, end - start);
  const volume = (m3: number) => formatWithUnit(m3, 'storage', system);
  const { balance } = reservoir;
  return (
    <Card title="Reservoir">
      <Facts
        facts={[
          {
            name: 'Highest stage',
            value: `${formatWithUnit(reservoir.peakStage, 'elevation', system)} at ${at(reservoir.peakStageTime)}`,
          },
          {
            name: 'Greatest release',
            value: `${formatWithUnit(reservoir.peakRelease, 'flow', system)} at ${at(reservoir.peakReleaseTime)}`,
          },
          { name: 'Held at the start', value: volume(balance.initial) },
          { name: 'Came in', value: volume(balance.inflow) },
          { name: 'Released', value: volume(balance.release) },
          { name: 'Held at the end', value: volume(balance.final) },
        ]}
      />
      {data ? (
        <Curves series={data} store={store} startsAt={run.startsAt} />
      ) : error ? (
        <ErrorState
          error={error}
          title="The reservoir could not be read"
          retry={() => void refetch()}
        />
      ) : (
        <Loading what="Reading the reservoir…" />
      )}
    </Card>
  );
}

interface CurvesProps {
  series: RunReservoirSeries;
  store: PlaceAndTimeStore;
  startsAt: string | null;
}

function Curves({ series, store, startsAt }: CurvesProps) {
  const curves = useMemo(() => {
    const { times, stage, inflow, release } = series;
    return {
      stage: { times, values: stage },
      inflow: { times, values: inflow },
      release: { times, values: release },
    };
  }, [series]);
  const common = { place: 'the reservoir', store, startsAt };
  return (
    <>
      <SeriesCard {...common} title="Stage" quantity="elevation" series={curves.stage} />
      <SeriesCard
        {...common}
        title="Release"
        note="inflow dashed"
        quantity="flow"
        series={curves.release}
        compare={curves.inflow}
      />
    </>
  );
}
