import type { ComparedPlace } from '@/shared/comparison/types';

/** The place that is meant by a chainage, m: the nearest there is, a station before a section; the first without one. */
export function placeNear(places: readonly ComparedPlace[], at: number | null): ComparedPlace {
  if (at === null) return places[0];
  return places.reduce((best, place) =>
    Math.abs(place.chainage - at) < Math.abs(best.chainage - at) ? place : best,
  );
}
