import { useMemo } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import type { Run } from '@/shared/runs/types';
import { SeriesCard } from '../runs/results/SeriesCard';
import type { PlaceResults } from '../runs/results/usePlaceResults';
import { pointsAt, type RaisedPoints } from './raisedPoints';

interface Props {
  run: Run;
  place: PlaceResults;
  store: PlaceAndTimeStore;
  raised: RaisedPoints;
  onPoint: (id: number) => void;
}

/** Stage at the chosen place: a press on the curve chooses the moment. */
export function StageCard({ run, place, store, raised, onPoint }: Props) {
  const { series, name } = place;
  const curve = useMemo(() => series && { times: series.times, values: series.stage }, [series]);
  const points = useMemo(() => (series ? pointsAt(raised, series.chainage) : []), [raised, series]);
  if (!series || !curve) return null;
  const { peakStage, peakStageTime } = series.peaks;
  return (
    <SeriesCard
      title="Stage"
      place={name}
      note={name}
      quantity="elevation"
      series={curve}
      peak={{ value: peakStage, time: peakStageTime }}
      points={points}
      onPoint={onPoint}
      store={store}
      startsAt={run.startsAt}
    />
  );
}
