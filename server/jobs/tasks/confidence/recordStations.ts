import type { CaseFile } from '../../../../shared/case/caseFile';
import type { ResultFile } from '../../../../shared/case/resultFile';
import type { NamedPlace } from '../../../../shared/confidence/types';
import { mix, placeBetween, SAME_CHAINAGE } from '../../../results/placeBetween';
import { buildGrid, type RunOutput } from '../../../solvers';

/** Tenths of a millimetre and of a litre a second: finer than any band deserves, and half as large to keep. */
const toTenths = (value: number): number => Math.round(value * 1e4) / 1e4;

/** Stage and flow against time at stations: exact at a surveyed section, linear between neighbouring cells elsewhere. */
export function recordStations(caseFile: CaseFile, stations: NamedPlace[]) {
  const { chainage } = buildGrid(caseFile);
  const last = chainage.length - 1;
  const between = stations.map((station) =>
    placeBetween(chainage, Math.min(chainage[last], Math.max(chainage[0], station.chainage)))!,
  );
  const stage = stations.map((): number[] => []);
  const flow = stations.map((): number[] => []);
  return {
    add(output: RunOutput): void {
      between.forEach(({ lower, upper, share }, s) => {
        stage[s].push(toTenths(mix(output.stage[lower], output.stage[upper], share)));
        flow[s].push(toTenths(mix(output.flow[lower], output.flow[upper], share)));
      });
    },
    /** [station][output time] */
    series({ sections }: ResultFile): { stage: number[][]; flow: number[][] } {
      stations.forEach((station, s) => {
        const section = sections.find(
          (candidate) => Math.abs(candidate.chainage - station.chainage) <= SAME_CHAINAGE,
        );
        if (!section) return;
        stage[s] = section.stage.map(toTenths);
        flow[s] = section.flow.map(toTenths);
      });
      return { stage, flow };
    },
  };
}
