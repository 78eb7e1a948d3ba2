import type { CaseFile } from '../../shared/case/caseFile';
import { worstHazard, type HazardClass } from '../../shared/hazard/hazardClass';
import type { LevelResult } from '../../shared/runs/levelResult';
import type { PlacePeaks, RunSeries, RunSurface } from '../../shared/runs/types';
import type { RunFacts } from '../results/blocks/blockTypes';
import type { RunBlocks } from '../results/blocks/runBlocks';
import { levelsAt } from '../results/levelsAt';
import { peaksAt } from '../results/peaksAt';
import { seriesAlong } from '../results/seriesAt';
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
  const series = await blocks.seriesOf([...run.sections.keys()]);
  const sections = run.sections.map(({ id, chainage }, k): PlaceResult => {
    const peaks = peaksAt(columns, run.inflowPeak, chainage)!;
    return { name: id, peaks, hazard: worstHazard(series[k].depth, series[k].velocity) };
  });
  const stations = await withSeries(blocks, facts.stations);
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

/** Those of the places that lie on the reach. */
async function withSeries(
  blocks: RunBlocks,
  places: readonly { name: string; chainage: number }[],
): Promise<PlaceSeries[]> {
  const found: PlaceSeries[] = [];
  let k = 0;
  for await (const series of seriesAlong(
    blocks,
    places.map(({ chainage }) => chainage),
  )) {
    const { name } = places[k++];
    if (!series) continue;
    const hazard = worstHazard(series.depth, series.velocity);
    found.push({ name, peaks: series.peaks, hazard, series });
  }
  return found;
}

function ends(blocks: RunBlocks, { sections }: RunFacts): Promise<PlaceSeries[]> {
  const last = sections.length - 1;
  const chosen = [...new Set([0, last >> 1, last])].map((k) => sections[k]);
  return withSeries(
    blocks,
    chosen.map(({ id, chainage }) => ({ name: id, chainage })),
  );
}
