import type { StructureRegime } from '../../shared/case/resultFile';
import type { RunReservoirSeries, RunStructureSeries } from '../../shared/runs/types';
import { REGIMES } from '../../shared/structures/structureWords';
import { evenly } from './blocks/evenly';
import type { RunBlocks } from './blocks/runBlocks';

/** More than a chart at any width resolves. */
const MOMENTS = 2400;

/** One structure against time; null where the run has none of this number. */
export async function structureSeries(
  blocks: RunBlocks,
  part: number,
): Promise<RunStructureSeries | null> {
  const { structures = [], times } = await blocks.facts();
  if (part < 0 || part >= structures.length) return null;
  const { flow, stageUp, stageDown, regime, width, bottom } = await blocks.structure(part);
  const thinned = thinner(times.length);
  return {
    times: thinned(times),
    flow: thinned(flow),
    stageUp: thinned(stageUp),
    stageDown: thinned(stageDown),
    regime: thinned(regime).map((at): StructureRegime => REGIMES[at]),
    ...(width && bottom && { breach: { width: thinned(width), bottom: thinned(bottom) } }),
  };
}

/** The reservoir against time; null where the upstream end is none. */
export async function reservoirSeries(blocks: RunBlocks): Promise<RunReservoirSeries | null> {
  const { reservoir, times } = await blocks.facts();
  if (!reservoir) return null;
  const { stage, volume, inflow, release } = await blocks.reservoir();
  const thinned = thinner(times.length);
  return {
    times: thinned(times),
    stage: thinned(stage),
    volume: thinned(volume),
    inflow: thinned(inflow),
    release: thinned(release),
  };
}

function thinner(length: number) {
  const kept = evenly(length, MOMENTS);
  return (values: ArrayLike<number>) => Array.from(kept, (k) => values[k]);
}
