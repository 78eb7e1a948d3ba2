import type { ShapedGrid } from './grid';
import { LEVEL_FIELDS, TABLE_STRIDE } from './sectionTable';
import { PART_FIELDS, PART_LAYOUT, PART_STRIDE, writePartedTable } from './partTable';

/**
 * What a run holds beside the workspace where sections have parts that do not flow or a momentum coefficient; index as
 * there. The system is then
 *   A_t + Q_x = q,   Q_t + (β Q²/A_f)_x + g A_f η_x + g A_f Q|Q|/K² = 0,
 * whose waves run at β v ± sqrt(c² + p v²) with v = Q/A_f, c² = g A_f/B and p = β² - (β B_f - A_f dβ/dη)/B.
 */
export interface Parts {
  /** Tables: PART_STRIDE numbers a section; see partTable.ts */
  table: Float64Array;
  /** Of the state of each cell: A_f (m²), β, p */
  flowArea: Float64Array;
  beta: Float64Array;
  spread: Float64Array;
}

/**
 * (c² + p v²)/c² is not let fall below this: where β falls faster with the stage than the water can follow, the
 * equations have no real waves.
 */
export const LEAST_SPREAD = 0.04;

/** Rewrites the tables of all sections of a grid for what flows. */
export function createParts(
  { shapes, isCompound, isParted }: Pick<ShapedGrid, 'shapes' | 'isCompound' | 'isParted'>,
  table: Float64Array,
  levels: Int32Array,
): Parts | null {
  if (!isParted) return null;
  const size = levels.length;
  const parts: Parts = {
    table: new Float64Array(size * PART_STRIDE),
    flowArea: new Float64Array(size),
    beta: new Float64Array(size).fill(1),
    spread: new Float64Array(size),
  };
  let i = 0;
  for (const shape of shapes) {
    levels[i] = writePartedTable(
      shape,
      isCompound,
      table,
      i * TABLE_STRIDE,
      parts.table,
      i * PART_STRIDE,
    );
    i++;
  }
  return parts;
}

/** What flows of a section at a stage, read from the table of its parts. */
export interface FlowingPart {
  area: number;
  width: number;
  /** ∫ A_f dη from the foot of the level, m³ */
  thrust: number;
  beta: number;
  /** dβ/dη, 1/m */
  betaRise: number;
}

/** Fills `into` for section i at s (m) above the foot of the level at `row` of the main table. */
export function readPart(
  { table }: Parts,
  i: number,
  row: number,
  s: number,
  into: FlowingPart,
): void {
  const { AREA, B0, B1, BETA, BETA1 } = PART_LAYOUT;
  const at = i * PART_STRIDE + ((row - i * TABLE_STRIDE) / LEVEL_FIELDS) * PART_FIELDS;
  const foot = table[at + AREA];
  const b0 = table[at + B0];
  const b1 = table[at + B1];
  into.area = foot + s * (b0 + s * b1);
  into.thrust = s * (foot + s * (b0 / 2 + (s * b1) / 3));
  into.width = b0 + 2 * s * b1;
  into.beta = table[at + BETA] + s * table[at + BETA1];
  into.betaRise = table[at + BETA1];
}

export function emptyPart(): FlowingPart {
  return { area: 0, width: 0, thrust: 0, beta: 1, betaRise: 0 };
}

/** p of these waves at a top width (m) */
export function spreadOf({ area, width, beta, betaRise }: FlowingPart, topWidth: number): number {
  return beta * beta - (beta * width - area * betaRise) / topWidth;
}
