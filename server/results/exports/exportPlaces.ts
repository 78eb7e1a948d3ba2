import type { PlacePeaks } from '../../../shared/runs/types';
import type { Station } from '../../../shared/studies/types';
import type { RunBlocks } from '../blocks/runBlocks';
import { peaksAt } from '../peaksAt';

/** A row heading of the exports: a surveyed section or a station of the study, with its peaks. */
export interface ExportPlace {
  kind: 'section' | 'station';
  name: string;
  /** Index of the section; null for a station. */
  section: number | null;
  peaks: PlacePeaks;
}

/** Sections and the stations on the reach together, upstream to downstream. */
export async function exportPlaces(blocks: RunBlocks, stations: Station[]): Promise<ExportPlace[]> {
  const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
  const sections = facts.sections.map((s, section) => {
    return { kind: 'section' as const, name: s.id, section, chainage: s.chainage };
  });
  const named = stations.map(({ name, chainage }) => {
    return { kind: 'station' as const, name, section: null, chainage };
  });
  return [...sections, ...named]
    .sort((a, b) => a.chainage - b.chainage)
    .flatMap(({ chainage, ...place }) => {
      const peaks = peaksAt(places, facts.inflowPeak, chainage);
      return peaks ? [{ ...place, peaks }] : [];
    });
}
