import type { ReservoirResult, StructureResult } from '../../../shared/case/resultFile';
import type { StructureSet } from './structureSet';

/** Series of all structures and of the reservoir at the output times, and their peaks of every step. */
export interface StructureRecorder {
  /** After the last stage of a step */
  keep(): void;
  /** After the first fluxes of a step */
  follow(time: number): void;
  output(time: number): void;
  structures(): StructureResult[];
  reservoir(): ReservoirResult | null;
}

/** Flows are the mean of two stages, as those of the reach: see diagnostics/faceFlow.ts. */
export function createStructureRecorder(set: StructureSet, order: 1 | 2): StructureRecorder {
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
      return { structure, release, k, result, late: 0, flow: 0 };
    }),
  );
  const { pool } = set;
  const series = { stage: [] as number[], volume: [] as number[] };
  const flows = { inflow: [] as number[], release: [] as number[] };

  let isKept = false;

  return {
    keep() {
      if (order === 1) return;
      for (const entry of entries) entry.late = entry.release.flows[entry.k];
      isKept = true;
    },
    follow(time) {
      for (const entry of entries) {
        const { release, k, result } = entry;
        const { peak } = result;
        const flow = isKept ? 0.5 * (entry.late + release.flows[k]) : release.flows[k];
        entry.flow = flow;
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
      for (const { structure, release, flow, result } of entries) {
        result.flow.push(flow);
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
      const atHead = entries.filter(({ release }) => release === set.groups[0].release);
      flows.release.push(atHead.reduce((sum, { flow }) => sum + flow, 0));
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
