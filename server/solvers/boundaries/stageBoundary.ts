import type { CellTables } from '../geometry/cellTables';
import type { Series } from '../sources/series';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { createControlBoundary } from './controlBoundary';
import { createEndFlux } from './endFlux';
import { createEndSection } from './endSection';
import { createEndState, type End } from './endState';

/**
 * A given stage (m) outside, at either end; water may pass both ways. The flow follows from the characteristic that
 * leaves the reach, Q_b = Q ∓ (c ∓ u)(A_b - A) with the mean celerity, and is at most critical. Outflow that would be
 * faster than critical falls freely; outflow that arrives supercritical is held back only by a stage of greater force.
 */
export function createStageBoundary(
  workspace: Workspace,
  tables: CellTables,
  end: End,
  outside: Series,
): Boundary {
  const { section, outward } = end;
  const { bed } = workspace;
  const endState = createEndState(workspace, tables, end);
  const endFlux = createEndFlux(workspace, tables, end);
  const { celerityAt, criticalFlowAt, forceAt } = createEndSection(workspace, tables, section);
  const freeFall = createControlBoundary(workspace, tables, end, criticalFlowAt);

  return function stageBoundary(time) {
    const eta = outside(time);
    if (eta <= bed[section]) return freeFall(time);
    const inside = endState();
    const leaving = outward * inside.velocity;
    if (inside.area > 0 && leaving >= inside.celerity) {
      const held = forceAt(eta, inside.flow) > forceAt(inside.stage, inside.flow);
      return held && eta > inside.stage
        ? endFlux(eta, inside.flow)
        : endFlux(inside.stage, inside.flow, inside.path);
    }
    const a = tables.areaAt(section, eta);
    const c = celerityAt(eta);
    const out = outward * inside.flow + (leaving - 0.5 * (inside.celerity + c)) * (a - inside.area);
    const critical = a * c;
    if (out > critical) return freeFall(time);
    return endFlux(eta, outward * Math.max(out, -critical));
  };
}
