import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import { risingRoot } from './rootNear';

/** Hydraulics of one section of the tables, for boundaries and initial states. Flows in m³/s, stages in m. */
export interface EndSection {
  celerityAt(stage: number): number;
  /** A c: the flow that is critical at a stage */
  criticalFlowAt(stage: number): number;
  criticalStage(flow: number): number;
  /** Stage of uniform flow on a slope > 0 */
  normalStage(flow: number, slope: number): number;
  /** Q²/A + g I1 at a stage (m⁴/s²) */
  forceAt(stage: number, flow: number): number;
}

export function createEndSection(workspace: Workspace, tables: CellTables, i: number): EndSection {
  const { gravity, bed } = workspace;

  function celerityAt(stage: number): number {
    const a = tables.areaAt(i, stage);
    return a > 0 ? Math.sqrt((gravity * a) / tables.widthAt(i, stage)) : 0;
  }

  function criticalFlowAt(stage: number): number {
    return tables.areaAt(i, stage) * celerityAt(stage);
  }

  function criticalStage(flow: number): number {
    return risingRoot((eta) => criticalFlowAt(eta) - flow, bed[i], 1);
  }

  function normalStage(flow: number, slope: number): number {
    const root = Math.sqrt(slope);
    return risingRoot((eta) => tables.conveyanceAt(i, eta) * root - flow, bed[i], 1);
  }

  function forceAt(stage: number, flow: number): number {
    const a = tables.areaAt(i, stage);
    return (a > 0 ? (flow * flow) / a : 0) + gravity * tables.thrustAt(i, stage);
  }

  return { celerityAt, criticalFlowAt, criticalStage, normalStage, forceAt };
}
