import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import type { Workspace } from '../workspace';
import { risingRoot } from './rootNear';

/** Hydraulics of one section of the tables, for boundaries and initial states. Flows in m³/s, stages in m. */
export interface EndSection {
  /** Of still water, or of a flow */
  celerityAt(stage: number, flow?: number): number;
  /** The flow that is critical at a stage; A c where all flows evenly */
  criticalFlowAt(stage: number): number;
  criticalStage(flow: number): number;
  /** Stage of uniform flow on a slope > 0 */
  normalStage(flow: number, slope: number): number;
  /** β Q²/A_f + g I1 at a stage (m⁴/s²) */
  forceAt(stage: number, flow: number): number;
}

export function createEndSection(workspace: Workspace, tables: CellTables, i: number): EndSection {
  const { gravity, bed } = workspace;

  const waves = createSectionWaves(workspace, tables);

  function celerityAt(stage: number, flow = 0): number {
    return waves.celerityAt(i, stage, tables.areaAt(i, stage), flow);
  }

  function criticalFlowAt(stage: number): number {
    return waves.criticalFlowAt(i, stage);
  }

  function criticalStage(flow: number): number {
    return risingRoot((eta) => criticalFlowAt(eta) - flow, bed[i], 1);
  }

  function normalStage(flow: number, slope: number): number {
    const root = Math.sqrt(slope);
    return risingRoot((eta) => tables.conveyanceAt(i, eta) * root - flow, bed[i], 1);
  }

  function forceAt(stage: number, flow: number): number {
    const carried = waves.carriedAt(i, stage, tables.areaAt(i, stage), flow);
    return carried + gravity * tables.thrustAt(i, stage);
  }

  return { celerityAt, criticalFlowAt, criticalStage, normalStage, forceAt };
}
