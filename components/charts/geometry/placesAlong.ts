/** A place that can be chosen: a surveyed section, or a station of the study. */
export interface ReachPlace {
  chainage: number;
  kind: 'section' | 'station';
  name: string;
}

/** Sections and the stations between their ends, by chainage; a station on a section takes its place. */
export function placesAlong(
  sections: readonly { id: string; chainage: number }[],
  stations: readonly { name: string; chainage: number }[],
): ReachPlace[] {
  if (!sections.length) return [];
  const first = sections[0].chainage;
  const last = sections[sections.length - 1].chainage;
  const places = new Map<number, ReachPlace>();
  for (const { id, chainage } of sections)
    places.set(chainage, { chainage, kind: 'section', name: id });
  for (const { name, chainage } of stations)
    if (chainage >= first && chainage <= last)
      places.set(chainage, { chainage, kind: 'station', name });
  return [...places.values()].sort((a, b) => a.chainage - b.chainage);
}

/** Name of the place at a chainage; null between places. */
export const placeName = (places: readonly ReachPlace[], chainage: number): string | null =>
  places.find((place) => Math.abs(place.chainage - chainage) < 0.005)?.name ?? null;
