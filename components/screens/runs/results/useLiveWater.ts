import { useMemo } from 'react';
import { valueAt } from '@/components/charts/geometry/interpolate';
import { surfaceFrame, surfaceLevel } from '@/components/charts/geometry/surfaceFrame';
import type { LiveWater } from '@/components/charts/MovingWater';
import type { PlaceAndTimeStore } from '@/components/charts/placeAndTime';
import type { RunSeries, RunSummary, RunSurface } from '@/shared/runs/types';
import { useLiveTime } from './useLiveTime';

/** The water surface of the run that follows the time of the store by itself; at the place, that of its series where it is there. */
export function useLiveWater(
  store: PlaceAndTimeStore,
  summary: RunSummary,
  surface: RunSurface,
  at: number | null,
  series: RunSeries | null | undefined,
): LiveWater {
  const live = useLiveTime(store, summary.times.start);
  return useMemo(() => {
    const row = new Float32Array(surface.places);
    return {
      ...live,
      stageAt: (t) => surfaceFrame(surface, t, row),
      levelAt: (t) =>
        series ? valueAt(series.times, series.stage, t) : surfaceLevel(surface, t, at ?? 0),
    };
  }, [live, surface, at, series]);
}
