import type { CellTables } from '../geometry/cellTables';
import type { Series } from '../sources/series';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { createSectionWaves } from '../geometry/sectionWaves';
import { createEndFlux } from './endFlux';
import { createEndSection } from './endSection';
import { createEndState, upstreamEnd } from './endState';
import { createWallBoundary } from './wallBoundary';

/**
 * A given flow (m³/s, >= 0) enters at the upstream end. Its area follows from the outgoing characteristic,
 * A_b = A + (Q_in - Q)/(u + c) with the mean of both states in u + c, and is at least critical. Where the reach beside
 * it is supercritical nothing comes back: normal depth where that is below critical, else critical depth.
 */
export function createInflowBoundary(
  workspace: Workspace,
  tables: CellTables,
  inflow: Series,
): Boundary {
  const end = upstreamEnd();
  const { section } = end;
  const { n, dx, bed } = workspace;
  const endState = createEndState(workspace, tables, end);
  const endFlux = createEndFlux(workspace, tables, end);
  const waves = createSectionWaves(workspace, tables);
  const wall = createWallBoundary(workspace, tables, end);
  const { celerityAt, criticalFlowAt, criticalStage, normalStage } = createEndSection(
    workspace,
    tables,
    section,
  );
  const slope = n > 1 ? (bed[0] - bed[2]) / (1.5 * dx) : (bed[0] - bed[1]) / (0.5 * dx);

  // Both stages depend on the flow alone: a steady inflow computes them once.
  let knownFlow = -1;
  let critical = 0;
  let shooting = 0;
  function knowStages(flow: number): void {
    if (flow === knownFlow) return;
    knownFlow = flow;
    critical = criticalStage(flow);
    shooting = slope > 0 ? Math.min(critical, normalStage(flow, slope)) : critical;
  }

  return function inflowBoundary(time) {
    const flow = inflow(time);
    if (!(flow > 0)) return wall(time);
    const inside = endState();
    if (inside.area <= 0 || inside.velocity >= inside.celerity) {
      knowStages(flow);
      return endFlux(inside.area > 0 ? shooting : critical, flow, inside.path);
    }
    const { area, velocity, celerity } = inside;
    const change = flow - inside.flow;
    let speed = velocity + celerity;
    let a = area;
    let eta = inside.stage;
    for (let k = 0; k < 4; k++) {
      a = area + change / Math.max(speed, 0.25 * celerity);
      if (!(a > 0)) break;
      eta = tables.stageOf(section, a);
      if (Math.abs(change) <= 1e-6 * flow) break;
      const drift = waves.driftAt(section, eta, a, flow);
      speed = 0.5 * (velocity + celerity + drift + celerityAt(eta, flow));
    }
    if (!(a > 0) || criticalFlowAt(eta) < flow) {
      knowStages(flow);
      eta = critical;
    }
    return endFlux(eta, flow);
  };
}
