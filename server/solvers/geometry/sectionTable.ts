import type { SectionShape } from './sectionShape';
import { sweepStages, type StageSweep } from './stageSweep';
import { MAX_LEVELS, tableLevels } from './tableLevels';

/**
 * The table of one section. Level k holds eight numbers; with s = η - z:
 *   A = A_k + s (b0 + s b1),  B = b0 + 2 b1 s,  I1 = I1_k + s (A_k + s (b0/2 + s b1/3)) = ∫ A dη,
 *   V = K/A = v0 + s (v1 + s v2), in the lowest level V = v0 s^(2/3).
 * A and B are those of the polygon at every level, and I1 is the exact integral of this A, so that pressure and volume
 * agree to round-off. b1 >= 0 because no section narrows upwards. Above the last level b1 = v2 = 0.
 */
export const LEVEL_FIELDS = 8;
export const TABLE_STRIDE = MAX_LEVELS * LEVEL_FIELDS;

/** Where each number of a level stands. Take it apart once outside of loops: an import is a call at every use. */
export const LEVEL_LAYOUT = {
  Z: 0,
  AREA: 1,
  B0: 2,
  B1: 3,
  THRUST: 4,
  V0: 5,
  V1: 6,
  V2: 7,
} as const;

/** The levels (m) of a section's table and, between each two, the stage half way. */
export function tableStages(shape: SectionShape): Float64Array {
  const levels = tableLevels(shape);
  const count = levels.length;
  const stages = new Float64Array(2 * count - 1);
  for (let k = 0; k < count; k++) {
    stages[2 * k] = levels[k];
    if (k + 1 < count) stages[2 * k + 1] = 0.5 * (levels[k] + levels[k + 1]);
  }
  return stages;
}

/**
 * Writes the table of `shape` into `table` from `start` on; returns the number of levels. `stages` are those of tableStages,
 * and `sweep` what the section is there.
 */
export function writeSectionTable(
  shape: SectionShape,
  table: Float64Array,
  start: number,
  stages: Float64Array = tableStages(shape),
  sweep: StageSweep = sweepStages(shape, stages),
): number {
  const { Z, AREA, B0, B1, THRUST, V0, V1, V2 } = LEVEL_LAYOUT;
  const count = (stages.length + 1) / 2;
  const { area, width, conveyance } = sweep;
  const velocity = (m: number): number => (area[m] > 0 ? conveyance[m] / area[m] : 0);

  let thrust = 0;
  for (let k = 0; k < count; k++) {
    const row = start + k * LEVEL_FIELDS;
    const a = area[2 * k];
    const b0 = width[2 * k];
    table[row + Z] = stages[2 * k];
    table[row + AREA] = a;
    table[row + B0] = b0;
    table[row + THRUST] = thrust;
    if (k + 1 === count) {
      const below = row - LEVEL_FIELDS;
      const d = stages[2 * k] - stages[2 * k - 2];
      table[row + B1] = 0;
      table[row + V0] = velocity(2 * k);
      table[row + V1] = Math.max(0, table[below + V1] + 2 * d * table[below + V2]);
      table[row + V2] = 0;
      break;
    }
    const d = stages[2 * k + 2] - stages[2 * k];
    const b1 = Math.max(0, ((area[2 * k + 2] - a) / d - b0) / d);
    table[row + B1] = b1;
    thrust += d * (a + d * (b0 / 2 + (d * b1) / 3));
    const top = velocity(2 * k + 2);
    if (k === 0) {
      const root = Math.cbrt(d);
      table[row + V0] = top / (root * root);
      table[row + V1] = 0;
      table[row + V2] = 0;
    } else {
      const bottom = velocity(2 * k);
      const middle = velocity(2 * k + 1);
      table[row + V0] = bottom;
      table[row + V1] = (4 * middle - 3 * bottom - top) / d;
      table[row + V2] = (2 * (top + bottom) - 4 * middle) / (d * d);
    }
  }
  return count;
}
