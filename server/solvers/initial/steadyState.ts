import type { CaseFile } from '../../../shared/case/caseFile';
import { outletControl } from '../boundaries/downstreamBoundary';
import { createEndSection } from '../boundaries/endSection';
import { openSlope } from '../boundaries/openBoundary';
import { risingRoot } from '../boundaries/rootNear';
import type { CellTables } from '../geometry/cellTables';
import type { Grid } from '../geometry/grid';
import type { Laterals } from '../sources/laterals';
import type { LocalLosses } from '../sources/localLosses';
import { createSeries } from '../sources/series';
import type { StructureSet } from '../structures/structureSet';
import type { Workspace } from '../workspace';
import { steadyProfile } from './steadyProfile';

/** m, or share of a flow: what settles afterwards (settle.ts) does the rest. */
const CLOSE = 1e-5;

export interface SteadyState {
  /** m and m³/s, index 0..n+1 */
  stages: Float64Array;
  flows: Float64Array;
}

/** Steady flow for what upstream, downstream and laterals say at time 0, by integration of the profile. */
export function steadyState(
  caseFile: CaseFile,
  workspace: Workspace,
  tables: CellTables,
  grid: Grid,
  laterals: Laterals,
  structures: StructureSet | null,
  localLosses: LocalLosses | null,
): SteadyState {
  const { n, bed } = workspace;
  const { upstream, downstream } = caseFile;

  const flowsFor = (inflow: number): Float64Array =>
    Float64Array.from({ length: n + 2 }, (_, i) => {
      const x = i === 0 ? grid.start : i > n ? grid.start + n * grid.dx : grid.chainage[i - 1];
      return Math.max(0, inflow + laterals.totalAbove(x, 0));
    });
  const stateFor = (inflow: number): SteadyState => {
    const flows = flowsFor(inflow);
    const outlet = outletStage(flows[n + 1]);
    return {
      flows,
      stages: steadyProfile(workspace, tables, flows, outlet, structures, localLosses),
    };
  };

  switch (upstream.kind) {
    case 'inflow':
      return stateFor(createSeries(upstream.times, upstream.flows)(0));
    case 'wall':
      return stateFor(0);
    case 'reservoir': {
      // What is released over water that the release itself makes.
      const surplus = (q: number): number =>
        q - (structures?.firstRelease(stateFor(q).stages[0]) ?? 0);
      const most = structures?.firstRelease(bed[0]) ?? 0;
      return stateFor(risingRoot(surplus, 0, Math.max(most, 1e-6), CLOSE * most));
    }
    case 'stage': {
      const wanted = createSeries(upstream.times, upstream.stages)(0);
      const still = stateFor(0);
      if (!still.flows.some((q) => q > 0)) {
        const pools = still.stages.slice();
        if (levelPools(pools, wanted)) return { ...still, stages: pools };
      }
      if (still.stages[0] >= wanted) return still;
      const excess = (q: number): number => stateFor(q).stages[0] - wanted;
      const { criticalFlowAt } = createEndSection(workspace, tables, 0);
      return stateFor(risingRoot(excess, 0, Math.max(0.25 * criticalFlowAt(wanted), 1e-6), CLOSE));
    }
  }

  /**
   * Levels still water with the stage upstream as far as a structure or ground holds it back, and lets what stands higher
   * beyond run back over that. False where nothing holds it back.
   */
  function levelPools(stages: Float64Array, level: number): boolean {
    let ceiling = level;
    let isHeld = false;
    for (let i = 0; i <= n + 1; i++) {
      const stage = isHeld ? Math.min(stages[i], ceiling) : level;
      stages[i] = Math.max(bed[i], stage);
      const barrier = Math.max(structures?.keepsBack(i) ?? -Infinity, bed[i + 1] ?? -Infinity);
      if (barrier >= level) isHeld = true;
      ceiling = Math.max(ceiling, barrier);
    }
    return isHeld;
  }

  function outletStage(flow: number): number {
    const section = createEndSection(workspace, tables, n + 1);
    const floor = bed[n + 1];
    if (downstream.kind === 'stage') {
      return Math.max(floor, createSeries(downstream.times, downstream.stages)(0));
    }
    if (!(flow > 0)) return floor;
    const control = outletControl(workspace, tables, downstream);
    if (control) {
      const released = (eta: number): number =>
        Math.min(control(eta), section.criticalFlowAt(eta)) - flow;
      return risingRoot(released, floor, 1);
    }
    const slope = openSlope(workspace);
    return slope > 0 ? section.normalStage(flow, slope) : section.criticalStage(flow);
  }
}
