import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { createEndFlux } from './endFlux';
import { createEndSection } from './endSection';
import { createEndState, type End } from './endState';
import { rootNear } from './rootNear';

/**
 * An outlet whose flow is a rising function R of its stage: normal depth, a rating, critical depth. Stage and flow are
 * where R meets the outgoing characteristic Q_b = Q + (u - c)(A_b - A), with the mean celerity. R is at most critical.
 * Supercritical water leaves as it comes, unless the stage that R wants has the greater force. Nothing enters.
 */
export function createControlBoundary(
  workspace: Workspace,
  tables: CellTables,
  end: End,
  control: (stage: number) => number,
): Boundary {
  const { section, cell, outward } = end;
  const { bed, stage } = workspace;
  const endState = createEndState(workspace, tables, end, true);
  const endFlux = createEndFlux(workspace, tables, end);
  const { celerityAt, criticalFlowAt, forceAt } = createEndSection(workspace, tables, section);

  const { min } = Math;
  // What the search below reads: set before each search, so that the search makes no closure.
  let out = 0;
  let area = 0;
  let velocity = 0;
  let celerity = 0;
  const released = (eta: number): number => min(control(eta), criticalFlowAt(eta));
  const surplus = (eta: number): number => released(eta) - out;
  const mismatch = (eta: number): number => {
    const c = 0.5 * (celerity + celerityAt(eta));
    const speed = min(velocity - c, -0.25 * celerity);
    return released(eta) - out - speed * (tables.areaAt(section, eta) - area);
  };

  return function controlBoundary() {
    const inside = endState();
    if (inside.area <= 0) return endFlux(stage[cell], 0);
    out = outward * inside.flow;
    area = inside.area;
    velocity = outward * inside.velocity;
    celerity = inside.celerity;
    const last = stage[section];
    const step = 1e-3 * Math.max(inside.stage - bed[section], 1e-3);
    if (velocity >= celerity) {
      const wanted = rootNear(surplus, bed[section], last, step);
      const held = wanted > inside.stage && forceAt(wanted, out) > forceAt(inside.stage, out);
      return held ? endFlux(wanted, inside.flow) : endFlux(inside.stage, inside.flow, inside.path);
    }
    const eta = rootNear(mismatch, bed[section], last, step);
    if (eta <= bed[section]) return endFlux(inside.stage, 0);
    return endFlux(eta, outward * released(eta));
  };
}
