import type { ReservoirResult, StructureResult } from '../../../shared/case/resultFile';
import type { StructureSet } from './structureSet';

/** Series of all structures and of the reservoir at the output times, and their peaks of every step. */
export interface StructureRecorder {
  follow(time: number): void;
  output(time: number): void;
  structures(): StructureResult[];
  reservoir(): ReservoirResult | null;
}

export function createStructureRecorder(set: StructureSet): StructureRecorder {
  const entries = set.groups.flatMap(({ structures, release }) =>
    structures.map((structure, k) => {
      const result: StructureResult = {
        id: structure.id,
        kind: structure.kind,
        chainage: structure.chainage,
        flow: [],
        stageUp: [],
        stageDown: [],
        regime: [],
        peak: { flow: 0, flowTime: 0, stageUp: -Infinity, stageUpTime: 0 },
      };
      if (structure.opening) result.breach = { width: [], bottom: [] };
      return { structure, release, k, result };
    }),
  );
  const { pool } = set;
  const series = { stage: [] as number[], volume: [] as number[] };
  const flows = { inflow: [] as number[], release: [] as number[] };

  return {
    follow(time) {
      for (const { release, k, result } of entries) {
        const { peak } = result;
        const flow = release.flows[k];
        if (Math.abs(flow) > Math.abs(peak.flow)) {
          peak.flow = flow;
          peak.flowTime = time;
        }
        if (release.stageUp() > peak.stageUp) {
          peak.stageUp = release.stageUp();
          peak.stageUpTime = time;
        }
      }
    },
    output(time) {
      for (const { structure, release, k, result } of entries) {
        result.flow.push(release.flows[k]);
        result.stageUp.push(release.stageUp());
        result.stageDown.push(release.stageDown());
        result.regime.push(structure.regime());
        const opening = structure.opening?.();
        if (opening && result.breach) {
          result.breach.width.push(opening.width);
          result.breach.bottom.push(opening.bottom);
        }
      }
      if (!pool) return;
      series.stage.push(pool.stage());
      series.volume.push(pool.volume());
      flows.inflow.push(pool.inflow(time));
      flows.release.push(set.groups[0].release.flows.reduce((sum, flow) => sum + flow, 0));
    },
    structures: () => entries.map(({ result }) => result),
    reservoir() {
      if (!pool) return null;
      const { initial, inflow, release, final } = pool.balance();
      const error = final - initial - inflow + release;
      const turnover = Math.max(Math.abs(initial) + Math.abs(inflow), Math.abs(final) + release);
      const relativeError = turnover > 0 ? error / turnover : 0;
      return {
        ...series,
        ...flows,
        balance: { initial, inflow, release, final, error, relativeError },
      };
    },
  };
}
