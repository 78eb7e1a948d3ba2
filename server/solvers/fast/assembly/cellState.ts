/** The state that follows from the area of a cell, as geometry/cellState.ts; for two cells at once where both are plain. */
import * as ws from './arrays';
import {
  add,
  at,
  below,
  both,
  div,
  and,
  mul,
  pairAt,
  put,
  putPair,
  root,
  sub,
  upTo,
} from './lanes';
import {
  AREA,
  B0,
  B1,
  entry,
  LEVEL_FIELDS,
  levelOf,
  levelsOf,
  rowHolding,
  TABLE_STRIDE,
  V0,
  V1,
  V2,
  Z,
} from './tables';

const TINY: f64 = 1e-30;

function activate(i: i32, row: i32): void {
  const k = (row - i * TABLE_STRIDE) / LEVEL_FIELDS;
  store<i32>(ws.level + ((i as usize) << 2), k);
  put(ws.levelZ, i, entry(row, Z));
  put(ws.levelArea, i, entry(row, AREA));
  put(ws.levelEnd, i, k + 1 < levelsOf(i) ? entry(row + LEVEL_FIELDS, AREA) : Infinity);
  put(ws.levelB0, i, entry(row, B0));
  put(ws.levelB1, i, entry(row, B1));
  put(ws.levelV0, i, entry(row, V0));
  put(ws.levelV1, i, entry(row, V1));
  put(ws.levelV2, i, entry(row, V2));
}

function dry(i: i32): void {
  activate(i, i * TABLE_STRIDE);
  put(ws.area, i, 0);
  put(ws.stage, i, at(ws.bed, i));
  put(ws.width, i, at(ws.levelB0, i));
  put(ws.reach, i, 0);
  put(ws.celerity, i, 0);
  put(ws.friction, i, 0);
}

function conveyanceVelocity(i: i32, s: f64): f64 {
  if (levelOf(i) > 0) {
    return at(ws.levelV0, i) + s * (at(ws.levelV1, i) + s * at(ws.levelV2, i));
  }
  const third = NativeMath.cbrt(s);
  return at(ws.levelV0, i) * third * third;
}

export function place(i: i32, a: f64): void {
  if (a < at(ws.levelArea, i) || a >= at(ws.levelEnd, i)) activate(i, rowHolding(i, AREA, a));
  if (a <= 0) {
    dry(i);
    return;
  }
  const da = a - at(ws.levelArea, i);
  const b0 = at(ws.levelB0, i);
  const b = sqrt(b0 * b0 + 4 * at(ws.levelB1, i) * da);
  const s = da > 0 ? (2 * da) / (b0 + b) : 0;
  const quarter = (0.25 * a) / b;
  const v = conveyanceVelocity(i, s);
  put(ws.area, i, a);
  put(ws.stage, i, at(ws.levelZ, i) + s);
  put(ws.width, i, b);
  put(ws.reach, i, quarter);
  put(ws.celerity, i, sqrt(4 * ws.gravity * quarter));
  put(ws.friction, i, ws.gravity / (a * v * v + TINY));
}

/** Lanes of cells i and i + 1 whose area stays wet and in its active level, above the lowest. */
export function isPlain(i: i32, a: v128): v128 {
  const from = pairAt(ws.levelArea, i);
  // The area at the foot of a level is 0 in the lowest alone.
  const isIn = and(upTo(from, a), below(a, pairAt(ws.levelEnd, i)));
  return and(isIn, below(both(0), from));
}

/** `place` of cells i and i + 1, both plain. */
export function placePair(i: i32, a: v128): void {
  const gravity = both(ws.gravity);
  const da = sub(a, pairAt(ws.levelArea, i));
  const b0 = pairAt(ws.levelB0, i);
  const b = root(add(mul(b0, b0), mul(mul(both(4), pairAt(ws.levelB1, i)), da)));
  const s = and(div(mul(both(2), da), add(b0, b)), below(both(0), da));
  const quarter = div(mul(both(0.25), a), b);
  const v = add(
    pairAt(ws.levelV0, i),
    mul(s, add(pairAt(ws.levelV1, i), mul(s, pairAt(ws.levelV2, i)))),
  );
  putPair(ws.area, i, a);
  putPair(ws.stage, i, add(pairAt(ws.levelZ, i), s));
  putPair(ws.width, i, b);
  putPair(ws.reach, i, quarter);
  putPair(ws.celerity, i, root(mul(mul(both(4), gravity), quarter)));
  putPair(ws.friction, i, div(gravity, add(mul(mul(a, v), v), both(TINY))));
}
