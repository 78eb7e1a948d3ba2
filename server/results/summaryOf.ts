import { arrivalRule } from '../../shared/runs/arrivalRule';
import type { PlacePeaks, RunSummary } from '../../shared/runs/types';
import type { Station } from '../../shared/studies/types';
import type { RunBlocks } from './blocks/runBlocks';
import { levelsAt } from './levelsAt';
import { peaksAt } from './peaksAt';

/** What is read first of a run: peaks at the sections and at the stations, volume balance, warnings. */
export async function summaryOf(
  runId: number,
  blocks: RunBlocks,
  stations: Station[],
): Promise<Omit<RunSummary, 'signed'>> {
  const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
  const peaks = (chainage: number) => peaksAt(places, facts.inflowPeak, chainage);
  const { times } = facts;
  return {
    runId,
    times: {
      start: times[0],
      end: times[times.length - 1],
      interval: times.length > 1 ? times[1] - times[0] : 0,
      count: times.length,
    },
    inflowPeak: facts.inflowPeak,
    sections: withPeaks(facts.sections, peaks, ({ id }) => ({ id })),
    stations: withPeaks(stations, peaks, ({ id, name }) => ({ stationId: id, name })),
    levels: await levelsAt(blocks, stations),
    volume: facts.volume,
    structures: facts.structures ?? [],
    reservoir: facts.reservoir ?? null,
    warnings: facts.warnings,
    arrivalRule: arrivalRule(facts.arrivalThreshold),
    steps: facts.steps,
    cellUpdates: facts.cellUpdates,
    seconds: facts.seconds,
    cellCount: facts.cellCount,
    cellSize: facts.cellSize,
  };
}

/** Those of the places that lie on the reach, with their peaks. */
function withPeaks<P extends { chainage: number }, N>(
  at: P[],
  peaks: (chainage: number) => PlacePeaks | null,
  named: (place: P) => N,
): (PlacePeaks & N)[] {
  return at.flatMap((place) => {
    const found = peaks(place.chainage);
    return found ? [{ ...named(place), ...found }] : [];
  });
}
