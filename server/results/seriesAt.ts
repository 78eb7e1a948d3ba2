import type { RunSeries } from '../../shared/runs/types';
import type { PlaceColumns, RunFacts } from './blocks/blockTypes';
import { evenly } from './blocks/evenly';
import type { RunBlocks } from './blocks/runBlocks';
import { peaksAt } from './peaksAt';
import { mix, placeBetween } from './placeBetween';

/** More than a chart at any width resolves. */
const MOMENTS = 2400;

type Series = Omit<RunSeries, 'chainage' | 'sectionId' | 'peaks'>;

/**
 * Stage, depth, flow and velocity against time: exact at a surveyed section, linear between the neighbouring places of
 * the wave elsewhere. null off the reach.
 */
export async function seriesAt(blocks: RunBlocks, chainage: number): Promise<RunSeries | null> {
  const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
  const peaks = peaksAt(places, facts.inflowPeak, chainage);
  const between = placeBetween(places.chainage, chainage);
  if (!peaks || !between) return null;
  const section = between.share === 0 ? places.section[between.lower] : -1;
  const series =
    section >= 0
      ? await sectionSeries(blocks, facts, section)
      : await waveSeries(blocks, facts, places, chainage);
  const sectionId = section >= 0 ? facts.sections[section].id : null;
  return { chainage: peaks.chainage, sectionId, ...series, peaks };
}

async function sectionSeries(blocks: RunBlocks, facts: RunFacts, part: number): Promise<Series> {
  const series = await blocks.series(part);
  const kept = evenly(facts.times.length, MOMENTS);
  const thinned = (values: ArrayLike<number>) => Array.from(kept, (k) => values[k]);
  return {
    times: thinned(facts.times),
    stage: thinned(series.stage),
    depth: thinned(series.depth),
    flow: thinned(series.flow),
    velocity: thinned(series.velocity),
  };
}

async function waveSeries(
  blocks: RunBlocks,
  facts: RunFacts,
  places: PlaceColumns,
  chainage: number,
): Promise<Series> {
  const onWave = Array.from(places.wave.keys()).filter((i) => places.wave[i] >= 0);
  const lines = onWave.map((i) => places.chainage[i]);
  const { lower, upper, share } = placeBetween(lines, chainage)!;
  const [a, b] = await blocks.wave([lower, upper]);
  const [bedA, bedB] = [places.bed[onWave[lower]], places.bed[onWave[upper]]];
  const between = (of: (row: typeof a, bed: number) => (m: number) => number) =>
    facts.moments.map((_, m) => mix(of(a, bedA)(m), of(b, bedB)(m), share));
  const bed = mix(bedA, bedB, share);
  const depth = between((row) => (m) => row.depth[m]);
  return {
    times: facts.moments.map((k) => facts.times[k]),
    stage: depth.map((d) => bed + d),
    depth,
    flow: between((row) => (m) => row.flow[m]),
    velocity: between((row) => (m) => row.velocity[m]),
  };
}
