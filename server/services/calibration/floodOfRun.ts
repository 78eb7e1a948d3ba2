import type { ComputedFlood } from '../../../shared/calibration/compareFlood';
import type { RunBlocks } from '../../results/blocks/runBlocks';
import { peaksAt } from '../../results/peaksAt';
import { seriesAt } from '../../results/seriesAt';

/** Of a routed run. */
export async function floodOfRun(blocks: RunBlocks): Promise<ComputedFlood> {
  const [facts, places] = await Promise.all([blocks.facts(), blocks.places()]);
  return {
    peakAt: (chainage) => {
      const peaks = peaksAt(places, facts.inflowPeak, chainage);
      return peaks && { stage: peaks.peakStage, depth: peaks.peakDepth };
    },
    seriesAt: (chainage) => seriesAt(blocks, chainage),
  };
}
