import { partedSweep } from './partedSweep';
import { LEVEL_FIELDS, LEVEL_LAYOUT, tableStages, writeSectionTable } from './sectionTable';
import type { SectionShape } from './sectionShape';
import { MAX_LEVELS } from './tableLevels';

/**
 * What a table holds beside sectionTable.ts where sections have parts that do not flow, or where the momentum coefficient
 * is not 1. Level k, with s = η - z:
 *   A_f = A_k + s (b0 + s b1),  B_f = b0 + 2 b1 s,  β = β_k + s β1.
 * The thrust of such a section is that of what flows, I1 = ∫ A_f dη, and V = K/A keeps to the whole area.
 */
export const PART_FIELDS = 5;
export const PART_STRIDE = MAX_LEVELS * PART_FIELDS;

export const PART_LAYOUT = { AREA: 0, B0: 1, B1: 2, BETA: 3, BETA1: 4 } as const;

/**
 * Writes both tables of a section: into `table` from `start` on, into `partTable` from `partStart` on. Returns the number
 * of levels.
 */
export function writePartedTable(
  shape: SectionShape,
  isCompound: boolean,
  table: Float64Array,
  start: number,
  partTable: Float64Array,
  partStart: number,
): number {
  const { AREA, B0, B1, BETA, BETA1 } = PART_LAYOUT;
  const { THRUST } = LEVEL_LAYOUT;
  const stages = tableStages(shape);
  const sweep = partedSweep(shape, stages, isCompound);
  const count = writeSectionTable(shape, table, start, stages, sweep);
  let thrust = 0;
  for (let k = 0; k < count; k++) {
    const row = partStart + k * PART_FIELDS;
    const a = sweep.flowArea[2 * k];
    const b0 = sweep.flowWidth[2 * k];
    const beta = sweep.beta[2 * k];
    partTable[row + AREA] = a;
    partTable[row + B0] = b0;
    partTable[row + BETA] = beta;
    table[start + k * LEVEL_FIELDS + THRUST] = thrust;
    if (k + 1 === count) continue;
    const d = stages[2 * k + 2] - stages[2 * k];
    const b1 = ((sweep.flowArea[2 * k + 2] - a) / d - b0) / d;
    partTable[row + B1] = b1;
    // At the bed there is no water to tell a coefficient from: that of the next level holds.
    const below = k === 0 ? sweep.beta[2] : beta;
    partTable[row + BETA] = below;
    partTable[row + BETA1] = (sweep.beta[2 * k + 2] - below) / d;
    thrust += d * (a + d * (b0 / 2 + (d * b1) / 3));
  }
  return count;
}
