import { useMemo } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import { Card } from '@/components/ui/Card';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { gaugeRecordAt } from '@/shared/calibration/gaugeRecordAt';
import type { RunResiduals } from '@/shared/calibration/types';
import type { Run, RunSeries, RunSummary } from '@/shared/runs/types';
import { levelName } from '@/shared/studies/stationLevels';
import { pointsAt, type RaisedPoints } from '../../check/raisedPoints';
import { RatingCard } from './RatingCard';
import { SeriesCard } from './SeriesCard';
import type { PlaceResults } from './usePlaceResults';

interface Props {
  run: Run;
  summary: RunSummary;
  place: PlaceResults;
  store: PlaceAndTimeStore;
  /** The run against the observed flood that was chosen to be shown. */
  residuals: RunResiduals | null;
  raised: RaisedPoints;
  onPoint: (id: number) => void;
}

/** Stage, flow and velocity against time at the chosen place. */
export function PlaceSeries({ summary, place, ...rest }: Props) {
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
  return <Curves {...rest} levels={summary.levels} series={place.series} place={place.name} />;
}

interface CurvesProps extends Pick<Props, 'run' | 'store' | 'residuals' | 'raised' | 'onPoint'> {
  levels: RunSummary['levels'];
  series: RunSeries;
  place: string;
}

function Curves(props: CurvesProps) {
  const { run, levels, series, place, store, residuals, raised, onPoint } = props;
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
  const seen = useMemo(
    () => ({
      stage: gaugeRecordAt(residuals, series.chainage, 'stage'),
      flow: gaugeRecordAt(residuals, series.chainage, 'flow'),
    }),
    [residuals, series.chainage],
  );
  const points = useMemo(() => pointsAt(raised, series.chainage), [raised, series.chainage]);
  const common = { place, store, startsAt, points, onPoint };
  return (
    <>
      <SeriesCard
        {...common}
        title="Stage"
        quantity="elevation"
        note={noteOf(seen.stage && 'observed as crosses')}
        series={curves.stage}
        observed={seen.stage}
        levels={here}
        peak={{ value: peaks.peakStage, time: peaks.peakStageTime }}
      />
      <SeriesCard
        {...common}
        title="Flow"
        note={noteOf(given && 'inflow dashed', seen.flow && 'observed as crosses')}
        quantity="flow"
        series={curves.flow}
        observed={seen.flow}
        compare={given}
        peak={{ value: peaks.peakFlow, time: peaks.peakFlowTime }}
      />
      <SeriesCard {...common} title="Velocity" quantity="velocity" series={curves.velocity} />
      <RatingCard place={place} series={series} store={store} />
    </>
  );
}

const noteOf = (...words: (string | null)[]): string | undefined =>
  words.filter((word) => word !== null).join(', ') || undefined;
