import type { Workspace } from '../workspace';
import { createCellState, type CellState } from './cellState';
import type { CellTables } from './cellTables';
import { emptyPart, readPart, spreadOf, type Parts } from './parts';
import { LEAST_FLOWING } from './partedSweep';
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

  function follow(i: number): void {
    whole.follow(i);
    const a = area[i];
    if (!(a > 0)) {
      flowArea[i] = 0;
      beta[i] = 1;
      spread[i] = 0;
      return;
    }
    const row = i * TABLE_STRIDE + level[i] * LEVEL_FIELDS;
    readPart(parts, i, row, stage[i] - levelZ[i], part);
    // The stage of a trace of water can round to the bed, where nothing would flow.
    if (!(part.area > 0.5 * LEAST_FLOWING * a)) part.area = a;
    flowArea[i] = part.area;
    beta[i] = part.beta;
    spread[i] = spreadOf(part, width[i]);
    const share = part.area / a;
    celerity[i] *= sqrt(share);
    friction[i] *= share;
  }

  function place(i: number, a: number): void {
    area[i] = a;
    follow(i);
  }

  return {
    follow,
    place,
    placeAtStage(i, eta) {
      place(i, tables.areaAt(i, eta));
      if (area[i] > 0) stage[i] = eta;
    },
  };
}
