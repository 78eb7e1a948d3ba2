import type { ComputedFlood } from '../../../../shared/calibration/compareFlood';
import type { CaseFile } from '../../../../shared/case/caseFile';
import type { ResultFile } from '../../../../shared/case/resultFile';
import { mergePlaces } from '../../../results/blocks/mergePlaces';
import { peaksAt } from '../../../results/peaksAt';
import { mix, placeBetween, SAME_CHAINAGE } from '../../../results/placeBetween';
import { routeCase, type RunOutput } from '../../../solvers';

/** Stage and flow of the cells on both sides of each place, gathered while a case is routed. */
interface Recorded {
  times: number[];
  stage: number[][];
  flow: number[][];
}

/** Routes a case and keeps of it what is compared: the peaks, and the series at the named chainages (m). */
export function computeFlood(
  caseFile: CaseFile,
  gaugePlaces: readonly number[],
  shouldStop: () => boolean,
): ComputedFlood {
  const recorded: Recorded = { times: [], stage: [], flow: [] };
  const result = routeCase(caseFile, {
    shouldStop,
    onOutput: gaugePlaces.length > 0 ? (output) => keep(recorded, output) : undefined,
  });
  const places = mergePlaces(caseFile.sections, result);
  return {
    peakAt: (chainage) => {
      const peaks = peaksAt(places, null, chainage);
      return peaks && { stage: peaks.peakStage, depth: peaks.peakDepth };
    },
    seriesAt: async (chainage) => seriesAt(result, recorded, chainage),
  };
}

function keep(recorded: Recorded, { time, stage, flow }: RunOutput): void {
  recorded.times.push(time);
  recorded.stage.push(Array.from(stage));
  recorded.flow.push(Array.from(flow));
}

/** Exact at a surveyed section; elsewhere linear between the middles of the cells. */
function seriesAt({ sections, cells, times }: ResultFile, recorded: Recorded, chainage: number) {
  const section = sections.find((one) => Math.abs(one.chainage - chainage) <= SAME_CHAINAGE);
  if (section) return { times, stage: section.stage, flow: section.flow };
  const last = sections[sections.length - 1].chainage;
  if (chainage < sections[0].chainage || chainage > last) return null;
  const middles = cells.chainage;
  const inside = Math.min(Math.max(chainage, middles[0]), middles[middles.length - 1]);
  const { lower, upper, share } = placeBetween(middles, inside)!;
  const at = (rows: number[][]) => rows.map((row) => mix(row[lower], row[upper], share));
  return { times: recorded.times, stage: at(recorded.stage), flow: at(recorded.flow) };
}
