import { useMemo } from 'react';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import type { Run } from '@/shared/runs/types';
import { SeriesCard } from '../runs/results/SeriesCard';
import type { PlaceResults } from '../runs/results/usePlaceResults';

interface Props {
  run: Run;
  place: PlaceResults;
  store: PlaceAndTimeStore;
}

/** Stage at the chosen place: a press on the curve chooses the moment. */
export function StageCard({ run, place, store }: Props) {
  const { series, name } = place;
  const curve = useMemo(() => series && { times: series.times, values: series.stage }, [series]);
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
      store={store}
      startsAt={run.startsAt}
    />
  );
}
