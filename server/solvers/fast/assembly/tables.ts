/** Look-ups in the tables of sections, as geometry/cellTables.ts. */
import { gravity, level, levels, table } from './arrays';
import { at } from './lanes';

/** As geometry/sectionTable.ts: doubles a level and a section; a test holds them equal. */
export const LEVEL_FIELDS: i32 = 8;
export const TABLE_STRIDE: i32 = 608;
export const Z: i32 = 0;
export const AREA: i32 = 1;
export const B0: i32 = 2;
export const B1: i32 = 3;
export const THRUST: i32 = 4;
export const V0: i32 = 5;
export const V1: i32 = 6;
export const V2: i32 = 7;

export function entry(row: i32, field: i32): f64 {
  return at(table, row + field);
}

function count(array: usize, i: i32): i32 {
  return load<i32>(array + ((i as usize) << 2));
}

export function levelOf(i: i32): i32 {
  return count(level, i);
}

export function levelsOf(i: i32): i32 {
  return count(levels, i);
}

/** Row of the level that holds `value` of a rising field (Z or AREA), searched from the active level. */
export function rowHolding(i: i32, field: i32, value: f64): i32 {
  const start = i * TABLE_STRIDE;
  const last = start + (levelsOf(i) - 1) * LEVEL_FIELDS;
  let row = start + levelOf(i) * LEVEL_FIELDS;
  while (row > start && value < entry(row, field)) row -= LEVEL_FIELDS;
  while (row < last && value >= entry(row + LEVEL_FIELDS, field)) row += LEVEL_FIELDS;
  return row;
}

export function areaAt(i: i32, eta: f64): f64 {
  const row = rowHolding(i, Z, eta);
  const s = eta - entry(row, Z);
  if (s <= 0) return entry(row, AREA);
  return entry(row, AREA) + s * (entry(row, B0) + s * entry(row, B1));
}

export function thrustAt(i: i32, eta: f64): f64 {
  const row = rowHolding(i, Z, eta);
  const s = eta - entry(row, Z);
  if (s <= 0) return entry(row, THRUST);
  return (
    entry(row, THRUST) +
    s * (entry(row, AREA) + s * (entry(row, B0) / 2 + (s * entry(row, B1)) / 3))
  );
}

/** dω/dη = sqrt(g B/A) at s above the foot of a level */
function rateAt(row: i32, s: f64): f64 {
  const b0 = entry(row, B0);
  const b1 = entry(row, B1);
  return sqrt((gravity * (b0 + 2 * s * b1)) / (entry(row, AREA) + s * (b0 + s * b1)));
}

export function frontSpeedAt(i: i32, eta: f64): f64 {
  const start = i * TABLE_STRIDE;
  const foot = entry(start, Z);
  if (eta <= foot) return 0;
  const top = rowHolding(i, Z, eta);
  const end = min<f64>(eta, entry(start + LEVEL_FIELDS, Z));
  const a = areaAt(i, end);
  const b = entry(start, B0) + 2 * (end - foot) * entry(start, B1);
  let omega = ((2 * b * (end - foot)) / a) * sqrt((gravity * a) / b);
  for (let row = start + LEVEL_FIELDS; row <= top; row += LEVEL_FIELDS) {
    const s = (row === top ? eta : entry(row + LEVEL_FIELDS, Z)) - entry(row, Z);
    omega += (s / 6) * (rateAt(row, 0) + 4 * rateAt(row, 0.5 * s) + rateAt(row, s));
  }
  return omega;
}
