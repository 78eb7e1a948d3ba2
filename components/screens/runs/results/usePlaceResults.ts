import { useRunSeries } from '@/components/queries/runs';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { PlacePeaks, Run, RunSeries, RunSummary } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import { isOnReach, placeOf } from './placeOf';
import { useSettled } from './useSettled';

/** What is known of the chosen place. */
export interface PlaceResults {
  /** Chainage, m; null before a place is chosen. */
  at: number | null;
  /** Its own name, or its chainage. */
  name: string;
  where: string;
  peaks: PlacePeaks | null;
  /** Values against time: of this place, or still of the one before it. */
  series: RunSeries | null;
  /** The series is of this very place. */
  isCurrent: boolean;
  error: Error | null;
  retry: () => void;
}

/** Long enough that a drag along the ribbon asks for the places where it rests, not for all it passes. */
const REST_MS = 120;

export function usePlaceResults(run: Run, summary: RunSummary, place: number | null): PlaceResults {
  const unitSystem = useUnitSystem();
  const at = isOnReach(summary, place) ? place : null;
  const { data, error, refetch } = useRunSeries(run.id, useSettled(at, REST_MS));
  const series = data ?? null;
  const isCurrent = series !== null && at !== null && Math.abs(series.chainage - at) < 0.005;
  const named = at === null ? null : placeOf(summary, at);
  const where = at === null ? '' : formatWithUnit(at, 'chainage', unitSystem);
  return {
    at,
    name: named?.name ?? where,
    where,
    peaks: named ?? (isCurrent ? series.peaks : null),
    series,
    isCurrent,
    error,
    retry: () => void refetch(),
  };
}
