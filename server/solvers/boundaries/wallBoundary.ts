import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { createEndState, type End } from './endState';

/**
 * No flow. The momentum flux is that of the HLL solver against the mirrored state (A, -Q): with w the velocity towards
 * the wall, Q (2 w + c) for water running up and Q c for water drawing off.
 */
export function createWallBoundary(workspace: Workspace, tables: CellTables, end: End): Boundary {
  const { area, flow, stage, fluxArea, fluxLeft, fluxRight, gravity } = workspace;
  const { section, cell, face, outward } = end;
  const flux = outward === 1 ? fluxLeft : fluxRight;
  const endState = createEndState(workspace, tables, end);
  const waves = createSectionWaves(workspace, tables);
  const { cellFlowArea } = waves;

  return function wallBoundary() {
    const inside = endState();
    const towards = outward * inside.velocity;
    const running = workspace.parts ? outward * inside.flow : inside.area * towards;
    const flows = waves.flowAreaAt(section, inside.stage, inside.area);
    const momentum = running * (towards > 0 ? 2 * towards + inside.celerity : inside.celerity);
    area[section] = inside.area;
    flow[section] = 0;
    stage[section] = inside.stage;
    fluxArea[face] = 0;
    flux[face] =
      momentum +
      (inside.area > 0
        ? 0.5 * gravity * (inside.stage - stage[cell]) * (cellFlowArea[cell] + flows)
        : 0);
    return Math.abs(inside.velocity) + inside.celerity;
  };
}
