import type { PlacePeaks, RunSummary } from '@/shared/runs/types';

/** A place with its name where it has one, and the peaks found there. */
export interface NamedPeaks extends PlacePeaks {
  name: string | null;
  kind: 'station' | 'section' | 'between';
}

/** Address and survey give chainages to the centimetre. */
const SAME = 0.005;
const same = (chainage: number) => (place: PlacePeaks) =>
  Math.abs(place.chainage - chainage) <= SAME;

/** The station or surveyed section at a chainage, m; null between them. */
export function placeOf(summary: RunSummary, chainage: number): NamedPeaks | null {
  const station = summary.stations.find(same(chainage));
  if (station) return { ...station, kind: 'station' };
  const section = summary.sections.find(same(chainage));
  return section ? { ...section, name: section.id, kind: 'section' } : null;
}

/** Whether a chainage from an address lies on this reach at all. */
export function isOnReach({ sections }: RunSummary, chainage: number | null): chainage is number {
  return (
    chainage !== null &&
    chainage >= sections[0].chainage - SAME &&
    chainage <= sections[sections.length - 1].chainage + SAME
  );
}

/** What is looked at first: the first station, else the middle section, at the time of its highest water. */
export function firstLook({ stations, sections }: RunSummary): { at: number; t: number } {
  const place = stations[0] ?? sections[Math.floor(sections.length / 2)];
  return { at: place.chainage, t: place.peakStageTime };
}
