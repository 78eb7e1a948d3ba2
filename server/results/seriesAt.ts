import type { RunSeries } from '../../shared/runs/types';
import type { PlaceColumns, RunFacts, SeriesColumns } from './blocks/blockTypes';
import { evenly } from './blocks/evenly';
import type { RunBlocks, WaveRow } from './blocks/runBlocks';
import { peaksAt } from './peaksAt';
import { mix, placeBetween } from './placeBetween';

/** More than a chart at any width resolves. */
const MOMENTS = 2400;

type Series = Omit<RunSeries, 'chainage' | 'sectionId' | 'peaks'>;

/** Places that are read at once; the series of a longer reach never stand in memory all together. */
const AT_ONCE = 64;

/**
 * Stage, depth, flow and velocity against time: exact at a surveyed section, linear between the neighbouring places of
 * the wave elsewhere. null off the reach.
 */
export async function seriesAt(blocks: RunBlocks, chainage: number): Promise<RunSeries | null> {
  const { value } = await seriesAlong(blocks, [chainage]).next();
  return value ?? null;
}

/** The same of many places in their order: one reading of the sections and one of the wave for each `AT_ONCE` of them. */
export async function* seriesAlong(
  blocks: RunBlocks,
  chainages: readonly number[],
): AsyncGenerator<RunSeries | null, undefined> {
  const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
  for (let from = 0; from < chainages.length; from += AT_ONCE) {
    const asked = chainages.slice(from, from + AT_ONCE).map((chainage) => {
      const peaks = peaksAt(places, facts.inflowPeak, chainage);
      const between = placeBetween(places.chainage, chainage);
      const section = between?.share === 0 ? places.section[between.lower] : -1;
      return { peaks: between && peaks, section, chainage };
    });
    const known = asked.filter(({ peaks }) => peaks);
    const parts = [...new Set(known.flatMap(({ section }) => (section >= 0 ? section : [])))];
    const between = known.flatMap(({ section, chainage }) => (section < 0 ? chainage : []));
    const [columns, waves] = await Promise.all([
      parts.length > 0 ? blocks.seriesOf(parts) : [],
      between.length > 0 ? waveSeries(blocks, facts, places, between) : [],
    ]);
    for (const { peaks, section, chainage } of asked) {
      if (!peaks) {
        yield null;
        continue;
      }
      const series =
        section >= 0
          ? sectionSeries(facts, columns[parts.indexOf(section)])
          : waves[between.indexOf(chainage)];
      const sectionId = section >= 0 ? facts.sections[section].id : null;
      yield { chainage: peaks.chainage, sectionId, ...series, peaks };
    }
  }
  return undefined;
}

function sectionSeries(facts: RunFacts, series: SeriesColumns): Series {
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

/** At places between the surveyed sections. */
async function waveSeries(
  blocks: RunBlocks,
  facts: RunFacts,
  places: PlaceColumns,
  chainages: readonly number[],
): Promise<Series[]> {
  const onWave = Array.from(places.wave.keys()).filter((i) => places.wave[i] >= 0);
  const lines = onWave.map((i) => places.chainage[i]);
  const neighbours = chainages.map((chainage) => placeBetween(lines, chainage)!);
  const rows = await blocks.wave(neighbours.flatMap(({ lower, upper }) => [lower, upper]));
  return neighbours.map(({ lower, upper, share }, n) => {
    const [a, b] = [rows[2 * n], rows[2 * n + 1]];
    const [bedA, bedB] = [places.bed[onWave[lower]], places.bed[onWave[upper]]];
    const at = (of: (row: WaveRow) => Float32Array) =>
      facts.moments.map((_, m) => mix(of(a)[m], of(b)[m], share));
    const bed = mix(bedA, bedB, share);
    const depth = at((row) => row.depth);
    return {
      times: facts.moments.map((k) => facts.times[k]),
      stage: depth.map((d) => bed + d),
      depth,
      flow: at((row) => row.flow),
      velocity: at((row) => row.velocity),
    };
  });
}
