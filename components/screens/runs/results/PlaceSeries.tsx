import { useMemo } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import type { Run, RunSeries, RunSummary } from '@/shared/runs/types';
import { levelName } from '@/shared/studies/stationLevels';
import { RatingCard } from './RatingCard';
import { SeriesCard } from './SeriesCard';
import type { PlaceResults } from './usePlaceResults';

interface Props {
  run: Run;
  summary: RunSummary;
  place: PlaceResults;
  store: PlaceAndTimeStore;
}

/** Stage, flow and velocity against time at the chosen place. */
export function PlaceSeries({ run, summary, place, store }: Props) {
  if (place.error)
    return (
      <ErrorState
        error={place.error}
        title="The values at this place could not be read"
        retry={place.retry}
      />
    );
  if (!place.series)
    return (
      <Card title="Stage">
        <Loading what="Reading the values at this place…" />
      </Card>
    );
  return (
    <Curves
      run={run}
      levels={summary.levels}
      series={place.series}
      place={place.name}
      store={store}
    />
  );
}

interface CurvesProps {
  run: Run;
  levels: RunSummary['levels'];
  series: RunSeries;
  place: string;
  store: PlaceAndTimeStore;
}

function Curves({ run, levels, series, place, store }: CurvesProps) {
  const { startsAt, inflow } = run;
  const { times, stage, flow, velocity, peaks } = series;
  const curves = useMemo(
    () => ({
      stage: { times, values: stage },
      flow: { times, values: flow },
      velocity: { times, values: velocity },
    }),
    [times, stage, flow, velocity],
  );
  const here = useMemo(
    () =>
      levels
        .filter(({ chainage }) => Math.abs(chainage - series.chainage) < 0.005)
        .map((one) => ({ name: levelName(one), level: one.level })),
    [levels, series.chainage],
  );
  const given = useMemo(
    () => (inflow.times.length ? { times: inflow.times, values: inflow.flows } : null),
    [inflow],
  );
  const common = { place, store, startsAt };
  return (
    <>
      <SeriesCard
        {...common}
        title="Stage"
        quantity="elevation"
        series={curves.stage}
        levels={here}
        peak={{ value: peaks.peakStage, time: peaks.peakStageTime }}
      />
      <SeriesCard
        {...common}
        title="Flow"
        note={given ? 'inflow dashed' : undefined}
        quantity="flow"
        series={curves.flow}
        compare={given}
        peak={{ value: peaks.peakFlow, time: peaks.peakFlowTime }}
      />
      <SeriesCard {...common} title="Velocity" quantity="velocity" series={curves.velocity} />
      <RatingCard place={place} series={series} store={store} />
    </>
  );
}
