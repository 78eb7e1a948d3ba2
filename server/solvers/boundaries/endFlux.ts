import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import { LEVEL_FIELDS, TABLE_STRIDE } from '../geometry/sectionTable';
import type { Workspace } from '../workspace';
import type { End } from './endState';

/** Makes a boundary state the flux at an end; returns its fastest wave |u| + c (m/s). */
export type EndFlux = (stage: number, flow: number, path?: number) => number;

/**
 * The exact flux of a known state on the end section: Q, and β Q²/A_f with the pressure g ∫ A dη over the half cell between
 * the end and the middle of the cell, as the cell feels it; `path` is the share of the latter (see endState.ts). The state is kept in the arrays at the end's index.
 */
export function createEndFlux(workspace: Workspace, tables: CellTables, end: End): EndFlux {
  const { area, flow, stage, level, fluxArea, fluxLeft, fluxRight, gravity } = workspace;
  const { section, cell, face, outward } = end;
  const flux = outward === 1 ? fluxLeft : fluxRight;
  const waves = createSectionWaves(workspace, tables);
  const { cellFlowArea } = waves;

  return function endFlux(eta, q, path = 1) {
    // The next look-up at this section starts its search here.
    level[section] = (tables.rowAtStage(section, eta) - section * TABLE_STRIDE) / LEVEL_FIELDS;
    const a = tables.areaAt(section, eta);
    area[section] = a;
    flow[section] = q;
    stage[section] = eta;
    fluxArea[face] = q;
    const carried = waves.carriedAt(section, eta, a, q);
    const flows = waves.flowAreaAt(section, eta, a);
    flux[face] =
      carried + 0.5 * path * gravity * (eta - stage[cell]) * (cellFlowArea[cell] + flows);
    if (!(a > 0)) return 0;
    return Math.abs(waves.driftAt(section, eta, a, q)) + waves.celerityAt(section, eta, a, q);
  };
}
