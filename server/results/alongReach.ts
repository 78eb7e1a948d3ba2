import { worstMoment } from '../../shared/hazard/hazardClass';
import { firstAbove } from '../../shared/runs/crossings';
import type { AlongQuery } from '../../shared/runs/schemas';
import type { PlaceAlong, RunAlong, RunSeries } from '../../shared/runs/types';
import type { Station } from '../../shared/studies/types';
import type { RunBlocks } from './blocks/runBlocks';
import { seriesAlong } from './seriesAt';

/** Hazard, and arrival by a threshold of one's own, at every surveyed section and station, from the stored moments. */
export async function alongReach(
  blocks: RunBlocks,
  stations: Station[],
  { threshold, value }: AlongQuery,
): Promise<RunAlong> {
  const { sections, times } = await blocks.facts();
  const named = stations.map(({ id: stationId, name, chainage }) => ({
    stationId,
    name,
    chainage,
  }));
  const places = [...sections, ...named].map(({ chainage }) => chainage);
  const found: (PlaceAlong | null)[] = [];
  for await (const series of seriesAlong(blocks, places))
    found.push(
      series && {
        chainage: places[found.length],
        ...hazardOf(series),
        arrival: arrivalOf(series, threshold, value),
      },
    );
  const withFound = <P>(rows: P[], from: number) =>
    rows.flatMap((row, k) => {
      const place = found[from + k];
      return place ? [{ ...row, ...place }] : [];
    });
  return {
    threshold,
    value,
    interval: times.length > 1 ? times[1] - times[0] : 0,
    sections: withFound(
      sections.map(({ id }) => ({ id })),
      0,
    ),
    stations: withFound(named, sections.length),
  };
}

/** The worst class, from depth and mean velocity of the same moment, and when it is first reached. */
function hazardOf({ times, depth, velocity }: RunSeries) {
  const worst = worstMoment(depth, velocity);
  return { hazard: worst && worst.hazard.label, hazardFrom: worst && times[worst.index] };
}

function arrivalOf(series: RunSeries, threshold: AlongQuery['threshold'], value: number) {
  const { times, stage, flow } = series;
  if (threshold === 'flow') return firstAbove(times, flow, value);
  return firstAbove(times, stage, threshold === 'rise' ? stage[0] + value : value);
}
