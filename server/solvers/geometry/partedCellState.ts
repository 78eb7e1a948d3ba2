import type { Workspace } from '../workspace';
import { createCellState, type CellState } from './cellState';
import type { CellTables } from './cellTables';
import { emptyPart, readPart, spreadOf, type Parts } from './parts';
import { TABLE_STRIDE, LEVEL_FIELDS } from './sectionTable';

/** As createCellState, with the celerity and the friction of what flows; keeps the arrays of `parts`. */
export function createPartedCellState(
  workspace: Workspace,
  tables: CellTables,
  parts: Parts,
): CellState {
  const { area, stage, width, celerity, friction, level, levelZ } = workspace;
  const { flowArea, beta, spread } = parts;
  const whole = createCellState(workspace, tables);
  const part = emptyPart();
  const { sqrt } = Math;

  function place(i: number, a: number): void {
    whole.place(i, a);
    if (!(area[i] > 0)) {
      flowArea[i] = 0;
      beta[i] = 1;
      spread[i] = 0;
      return;
    }
    const row = i * TABLE_STRIDE + level[i] * LEVEL_FIELDS;
    readPart(parts, i, row, stage[i] - levelZ[i], part);
    flowArea[i] = part.area;
    beta[i] = part.beta;
    spread[i] = spreadOf(part, width[i]);
    const share = part.area / area[i];
    celerity[i] *= sqrt(share);
    friction[i] *= share;
  }

  return {
    place,
    placeAtStage(i, eta) {
      place(i, tables.areaAt(i, eta));
      if (area[i] > 0) stage[i] = eta;
    },
  };
}
