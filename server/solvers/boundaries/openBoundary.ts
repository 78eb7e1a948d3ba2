import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { createEndFlux } from './endFlux';
import { createEndState, type End } from './endState';

/** Waves leave: the state inside goes on outside. Nothing enters. */
export function createOpenBoundary(workspace: Workspace, tables: CellTables, end: End): Boundary {
  const { stage } = workspace;
  const endState = createEndState(workspace, tables, end);
  const endFlux = createEndFlux(workspace, tables, end);

  return function openBoundary() {
    const inside = endState();
    if (inside.area <= 0) return endFlux(stage[end.cell], 0);
    const leaves = end.outward * inside.flow > 0;
    return endFlux(inside.stage, leaves ? inside.flow : 0, inside.path);
  };
}
