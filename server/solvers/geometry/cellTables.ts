import type { Workspace } from '../workspace';
import { emptyPart, readPart } from './parts';
import { LEVEL_FIELDS as FIELDS, LEVEL_LAYOUT, TABLE_STRIDE as STRIDE } from './sectionTable';

/**
 * Looks up any section's table at any stage: for the faces, boundaries and initial states that leave the active level.
 * `i` is a cell or an end section; stages in m above the datum. Below the bed everything is 0.
 */
export interface CellTables {
  /** m² */
  areaAt(i: number, stage: number): number;
  /** m, just above the stage */
  widthAt(i: number, stage: number): number;
  /** ∫ A dη from the bed, of the area that flows; m³ */
  thrustAt(i: number, stage: number): number;
  /** m³/s */
  conveyanceAt(i: number, stage: number): number;
  /** Stage (m) at an area (m²) */
  stageOf(i: number, area: number): number;
  /** ω = ∫ c/A dA from dry to `stage` (m/s): a dry front runs at u + ω; 2c in a rectangle */
  frontSpeedAt(i: number, stage: number): number;
  /** Row in the table of the level that holds `stage`, searched from the active level */
  rowAtStage(i: number, stage: number): number;
  /** Row of the level that holds `area` */
  rowAtArea(i: number, area: number): number;
}

export function createCellTables(
  workspace: Pick<Workspace, 'table' | 'levels' | 'level' | 'gravity'> &
    Partial<Pick<Workspace, 'parts'>>,
): CellTables {
  const { table, levels, level, gravity, parts = null } = workspace;
  const part = emptyPart();
  const { Z, AREA, B0, B1, THRUST, V0, V1, V2 } = LEVEL_LAYOUT;
  const LEVEL_FIELDS = FIELDS;
  const TABLE_STRIDE = STRIDE;
  const { sqrt, cbrt, min } = Math;

  function rowAtStage(i: number, stage: number): number {
    const start = i * TABLE_STRIDE;
    const last = start + (levels[i] - 1) * LEVEL_FIELDS;
    let row = start + level[i] * LEVEL_FIELDS;
    while (row > start && stage < table[row + Z]) row -= LEVEL_FIELDS;
    while (row < last && stage >= table[row + LEVEL_FIELDS + Z]) row += LEVEL_FIELDS;
    return row;
  }

  function rowAtArea(i: number, area: number): number {
    const start = i * TABLE_STRIDE;
    const last = start + (levels[i] - 1) * LEVEL_FIELDS;
    let row = start + level[i] * LEVEL_FIELDS;
    while (row > start && area < table[row + AREA]) row -= LEVEL_FIELDS;
    while (row < last && area >= table[row + LEVEL_FIELDS + AREA]) row += LEVEL_FIELDS;
    return row;
  }

  function areaAt(i: number, stage: number): number {
    const row = rowAtStage(i, stage);
    const s = stage - table[row + Z];
    if (s <= 0) return table[row + AREA];
    return table[row + AREA] + s * (table[row + B0] + s * table[row + B1]);
  }

  function widthAt(i: number, stage: number): number {
    const row = rowAtStage(i, stage);
    const s = stage - table[row + Z];
    return s < 0 ? 0 : table[row + B0] + 2 * s * table[row + B1];
  }

  function thrustAt(i: number, stage: number): number {
    const row = rowAtStage(i, stage);
    const s = stage - table[row + Z];
    if (s <= 0) return table[row + THRUST];
    if (parts) {
      readPart(parts, i, row, s, part);
      return table[row + THRUST] + part.thrust;
    }
    const b0 = table[row + B0];
    return table[row + THRUST] + s * (table[row + AREA] + s * (b0 / 2 + (s * table[row + B1]) / 3));
  }

  function conveyanceAt(i: number, stage: number): number {
    const row = rowAtStage(i, stage);
    const s = stage - table[row + Z];
    if (s <= 0 && row === i * TABLE_STRIDE) return 0;
    const area = table[row + AREA] + s * (table[row + B0] + s * table[row + B1]);
    if (row > i * TABLE_STRIDE) {
      return area * (table[row + V0] + s * (table[row + V1] + s * table[row + V2]));
    }
    const root = cbrt(s);
    return area * table[row + V0] * root * root;
  }

  function stageOf(i: number, area: number): number {
    const row = rowAtArea(i, area);
    const da = area - table[row + AREA];
    if (da <= 0) return table[row + Z];
    const b0 = table[row + B0];
    return table[row + Z] + (2 * da) / (b0 + sqrt(b0 * b0 + 4 * table[row + B1] * da));
  }

  /** dω/dη = sqrt(g B/A) at s above the foot of a level */
  function rateAt(row: number, s: number): number {
    const b0 = table[row + B0];
    const b1 = table[row + B1];
    return sqrt((gravity * (b0 + 2 * s * b1)) / (table[row + AREA] + s * (b0 + s * b1)));
  }

  function frontSpeedAt(i: number, stage: number): number {
    const start = i * TABLE_STRIDE;
    if (stage <= table[start + Z]) return 0;
    const top = rowAtStage(i, stage);
    // In the lowest level A is near a power of the depth, A ~ s^m, for which ω = 2 m c.
    const end = min(stage, table[start + LEVEL_FIELDS + Z]);
    const a = areaAt(i, end);
    const b = table[start + B0] + 2 * (end - table[start + Z]) * table[start + B1];
    let omega = ((2 * b * (end - table[start + Z])) / a) * sqrt((gravity * a) / b);
    // Above it ω = ∫ sqrt(g B/A) dη, by Simpson's rule.
    for (let row = start + LEVEL_FIELDS; row <= top; row += LEVEL_FIELDS) {
      const s = (row === top ? stage : table[row + LEVEL_FIELDS + Z]) - table[row + Z];
      omega += (s / 6) * (rateAt(row, 0) + 4 * rateAt(row, 0.5 * s) + rateAt(row, s));
    }
    return omega;
  }

  return {
    areaAt,
    widthAt,
    thrustAt,
    conveyanceAt,
    stageOf,
    frontSpeedAt,
    rowAtStage,
    rowAtArea,
  };
}
