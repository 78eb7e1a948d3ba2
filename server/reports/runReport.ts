import type { CaseFile } from '../../shared/case/caseFile';
import { worstHazard, type HazardClass } from '../../shared/hazard/hazardClass';
import type { LevelResult } from '../../shared/runs/levelResult';
import type { PlacePeaks, RunSeries, RunSurface } from '../../shared/runs/types';
import type { RunFacts } from '../results/blocks/blockTypes';
import type { RunBlocks } from '../results/blocks/runBlocks';
import { levelsAt } from '../results/levelsAt';
import { peaksAt } from '../results/peaksAt';
import { seriesAt } from '../results/seriesAt';
import { surfaceOf } from '../results/surfaceOf';
import type { ReportFacts } from './types';

/** A row of the result tables. */
export interface PlaceResult {
  name: string;
  peaks: PlacePeaks;
  /** Worst class over time of depth and mean velocity; null: dry throughout. */
  hazard: HazardClass | null;
}

/** A place with its hydrographs. */
export interface PlaceSeries extends PlaceResult {
  series: RunSeries;
}

/** Everything that is drawn and printed of a run. */
export interface RunReport {
  facts: ReportFacts;
  caseFile: CaseFile;
  run: RunFacts;
  /** The wave at its first and last moment, with bed, banks and peak along the reach. */
  surface: RunSurface;
  sections: PlaceResult[];
  /** The study's stations on the reach; without any, the first, the middle and the last section. */
  places: PlaceSeries[];
  placesAreStations: boolean;
  /** Levels at the stations against the highest water. */
  levels: LevelResult[];
}

/** Places along the long section: more than a page resolves. */
const ALONG = 600;

export async function runReport(
  blocks: RunBlocks,
  caseFile: CaseFile,
  facts: ReportFacts,
): Promise<RunReport> {
  const [run, columns] = await Promise.all([blocks.facts(), blocks.places()]);
  const sections: PlaceResult[] = [];
  for (const [k, { id, chainage }] of run.sections.entries()) {
    const { depth, velocity } = await blocks.series(k);
    const peaks = peaksAt(columns, run.inflowPeak, chainage)!;
    sections.push({ name: id, peaks, hazard: worstHazard(depth, velocity) });
  }
  const stations: PlaceSeries[] = [];
  for (const { name, chainage } of facts.stations) {
    const place = await withSeries(blocks, name, chainage);
    if (place) stations.push(place);
  }
  const places = stations.length > 0 ? stations : await ends(blocks, run);
  return {
    facts,
    caseFile,
    run,
    surface: await surfaceOf(blocks, { places: ALONG, moments: 2 }),
    sections,
    places,
    placesAreStations: stations.length > 0,
    levels: await levelsAt(blocks, facts.stations),
  };
}

async function withSeries(
  blocks: RunBlocks,
  name: string,
  chainage: number,
): Promise<PlaceSeries | null> {
  const series = await seriesAt(blocks, chainage);
  if (!series) return null;
  const hazard = worstHazard(series.depth, series.velocity);
  return { name, peaks: series.peaks, hazard, series };
}

async function ends(blocks: RunBlocks, { sections }: RunFacts): Promise<PlaceSeries[]> {
  const last = sections.length - 1;
  const chosen = [...new Set([0, last >> 1, last])];
  const places = await Promise.all(
    chosen.map((k) => withSeries(blocks, sections[k].id, sections[k].chainage)),
  );
  return places.filter((place) => place !== null);
}
