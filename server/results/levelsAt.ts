import { levelResult, type LevelResult } from '../../shared/runs/levelResult';
import type { Station } from '../../shared/studies/types';
import type { RunBlocks } from './blocks/runBlocks';
import { seriesAlong } from './seriesAt';

/** Freeboard and times of every level at the stations that lie on the reach, lowest level of a station first. */
export async function levelsAt(
  blocks: RunBlocks,
  stations: readonly Station[],
): Promise<LevelResult[]> {
  const results: LevelResult[] = [];
  const asked = stations.filter(({ levels }) => levels?.length);
  let k = 0;
  for await (const series of seriesAlong(
    blocks,
    asked.map(({ chainage }) => chainage),
  )) {
    const station = asked[k++];
    if (!series) continue;
    const stage = { ...series.peaks, times: series.times, stage: series.stage };
    const rising = [...(station.levels ?? [])].sort((a, b) => a.level - b.level);
    results.push(...rising.map((level) => levelResult(station, level, stage)));
  }
  return results;
}
