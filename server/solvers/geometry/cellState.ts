import type { Workspace } from '../workspace';
import type { CellTables } from './cellTables';
import { LEVEL_FIELDS, LEVEL_LAYOUT, TABLE_STRIDE } from './sectionTable';

/** Keeps the friction factor of the last trace of water finite; far below any A V² that moves. */
const TINY = 1e-30;

/** Sets the area of a cell and all that follows from it: stage, top width, celerity, friction factor. */
export interface CellState {
  /** From the area (m², not negative) that `workspace.area` holds. A number handed over would be an object on the heap. */
  follow(i: number): void;
  /** From an area (m², not negative). */
  place(i: number, area: number): void;
  /** From a stage (m), which is kept to the last bit. Below the bed: dry. */
  placeAtStage(i: number, stage: number): void;
}

export function createCellState(workspace: Workspace, tables: CellTables): CellState {
  const { area, stage, width, celerity, reach, friction, bed, gravity } = workspace;
  const { level, levelZ, levelArea, levelEnd, levelB0, levelB1 } = workspace;
  const { levelV0, levelV1, levelV2, levels, table } = workspace;
  const { Z, AREA, B0, B1, V0, V1, V2 } = LEVEL_LAYOUT;
  const { sqrt, cbrt } = Math;
  const fourG = 4 * gravity;

  function activate(i: number, row: number): void {
    const k = (row - i * TABLE_STRIDE) / LEVEL_FIELDS;
    level[i] = k;
    levelZ[i] = table[row + Z];
    levelArea[i] = table[row + AREA];
    levelEnd[i] = k + 1 < levels[i] ? table[row + LEVEL_FIELDS + AREA] : Infinity;
    levelB0[i] = table[row + B0];
    levelB1[i] = table[row + B1];
    levelV0[i] = table[row + V0];
    levelV1[i] = table[row + V1];
    levelV2[i] = table[row + V2];
  }

  function dry(i: number): void {
    activate(i, i * TABLE_STRIDE);
    area[i] = 0;
    stage[i] = bed[i];
    width[i] = levelB0[i];
    reach[i] = 0;
    celerity[i] = 0;
    friction[i] = 0;
  }

  function follow(i: number): void {
    const a = area[i];
    if (a < levelArea[i] || a >= levelEnd[i]) activate(i, tables.rowAtArea(i, a));
    const da = a - levelArea[i];
    const b0 = levelB0[i];
    const b = sqrt(b0 * b0 + 4 * levelB1[i] * da);
    if (a <= 0) {
      dry(i);
      return;
    }
    const s = da > 0 ? (2 * da) / (b0 + b) : 0;
    const quarter = (0.25 * a) / b;
    // K/A, the velocity for each root of slope
    let v = levelV0[i];
    if (level[i] > 0) v += s * (levelV1[i] + s * levelV2[i]);
    else {
      const root = cbrt(s);
      v = v * root * root;
    }
    stage[i] = levelZ[i] + s;
    width[i] = b;
    reach[i] = quarter;
    celerity[i] = sqrt(fourG * quarter);
    friction[i] = gravity / (a * v * v + TINY);
  }

  function place(i: number, a: number): void {
    area[i] = a;
    follow(i);
  }

  function placeAtStage(i: number, eta: number): void {
    place(i, tables.areaAt(i, eta));
    if (area[i] > 0) stage[i] = eta;
  }

  dryAll();
  return { follow, place, placeAtStage };

  function dryAll(): void {
    for (let i = 0; i < area.length; i++) dry(i);
  }
}
