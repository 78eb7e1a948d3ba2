/** The halves of a step, as time/stepLoops.ts and time/limitOutflow.ts. */
import * as ws from './arrays';
import { isPlain, place, placePair } from './cellState';
import {
  add,
  and,
  at,
  below,
  both,
  choose,
  div,
  greater,
  holds,
  lesser,
  mul,
  pairAt,
  put,
  putPair,
  root,
  size,
  sub,
  upTo,
} from './lanes';

const MOST_EXPLICIT: f64 = 0.25;

export function limitOutflow(dt: f64): void {
  const area = ws.area;
  const fluxArea = ws.fluxArea;
  const n = ws.n;
  const toFlow = ws.dx / dt;
  const zero = both(0);
  let i = 1;
  for (; i < n; i += 2) {
    const left = pairAt(fluxArea, i - 1);
    const right = pairAt(fluxArea, i);
    const out = sub(greater(zero, right), lesser(zero, left));
    if (!holds(upTo(out, mul(pairAt(area, i), both(toFlow))))) break;
  }
  for (; i <= n; i++) {
    const left = at(fluxArea, i - 1);
    const right = at(fluxArea, i);
    const out = (right > 0 ? right : 0) - (left < 0 ? left : 0);
    const held = at(area, i) * toFlow;
    if (out <= held) continue;
    const share = held / out;
    if (right > 0) put(fluxArea, i, right * share);
    if (left < 0) put(fluxArea, i - 1, left * share);
  }
}

function withLateral(i: i32, a: f64, dt: f64): f64 {
  const wanted = (dt * at(ws.lateralRate, i)) / ws.dx;
  const taken = wanted < -a ? -a : wanted;
  put(ws.lateralSums, 0, at(ws.lateralSums, 0) + (taken * ws.dx) / dt);
  put(ws.lateralSums, 1, at(ws.lateralSums, 1) + ((taken - wanted) * ws.dx) / dt);
  return a + taken;
}

function isWet(i: i32): bool {
  return at(ws.stage, i) - at(ws.bed, i) > ws.dryDepth;
}

function predictOne(i: i32, dt: f64): void {
  const ratio = dt / ws.dx;
  const old = at(ws.area, i);
  const q0 = at(ws.flow, i);
  put(ws.oldArea, i, old);
  let a = old - ratio * (at(ws.fluxArea, i) - at(ws.fluxArea, i - 1));
  let q = q0 - ratio * (at(ws.fluxLeft, i) - at(ws.fluxRight, i - 1));
  if (a < 0) a = 0;
  if (at(ws.lateralRate, i) !== 0) {
    const before = a;
    a = withLateral(i, a, dt);
    if (a < before) {
      if (a > 0.5 * before && old > 0) q += ((a - before) * q0) / old;
      else q *= a / before;
    }
  }
  const half = 0.5 * dt * at(ws.friction, i) * abs<f64>(q0);
  const e = half < MOST_EXPLICIT ? half : MOST_EXPLICIT;
  put(ws.implicitShare, i, half < MOST_EXPLICIT ? 0.5 : 1 - (0.5 * MOST_EXPLICIT) / half);
  put(ws.halfFlow, i, 0.5 * (q0 + q) - e * q0);
  if (a !== old) place(i, a);
  const m = 4 * dt * at(ws.friction, i);
  put(ws.flow, i, isWet(i) ? (2 * q) / (1 + sqrt(1 + m * abs<f64>(q))) : 0);
}

function correctOne(i: i32, dt: f64): bool {
  const ratio = dt / ws.dx;
  const old = at(ws.oldArea, i);
  let a = at(ws.area, i) - ratio * (at(ws.fluxArea, i) - at(ws.fluxArea, i - 1));
  let q = at(ws.halfFlow, i) - 0.5 * ratio * (at(ws.fluxLeft, i) - at(ws.fluxRight, i - 1));
  if (a < 0) a = 0;
  if (at(ws.lateralRate, i) !== 0) {
    const before = a;
    a = withLateral(i, a, dt);
    if (a < before) {
      const predicted = at(ws.area, i);
      if (a > 0.5 * before && predicted > 0) {
        q += (0.5 * (a - before) * at(ws.flow, i)) / predicted;
      } else q *= (old + a) / (old + before);
    }
  }
  a = 0.5 * (old + a);
  if (a !== at(ws.area, i)) place(i, a);
  const m = 4 * dt * at(ws.implicitShare, i) * at(ws.friction, i);
  put(ws.flow, i, isWet(i) ? (2 * q) / (1 + sqrt(1 + m * abs<f64>(q))) : 0);
  return a < 0.5 * old;
}

/** Lanes of cells i and i + 1 that change their area, have nothing from the side, and stay plain */
function isEasy(i: i32, a: v128, before: v128): v128 {
  const noLateral = f64x2.eq(pairAt(ws.lateralRate, i), both(0));
  return and(and(f64x2.ne(a, before), noLateral), isPlain(i, a));
}

/** 2 q/(1 + sqrt(1 + m |q|)) where cells i and i + 1 are wet, else 0 */
function braked(i: i32, q: v128, m: v128): v128 {
  const one = both(1);
  const wet = below(both(ws.dryDepth), sub(pairAt(ws.stage, i), pairAt(ws.bed, i)));
  return and(div(mul(both(2), q), add(one, root(add(one, mul(m, size(q)))))), wet);
}

export function predict(dt: f64): void {
  put(ws.lateralSums, 0, 0);
  put(ws.lateralSums, 1, 0);
  const area = ws.area;
  const flow = ws.flow;
  const friction = ws.friction;
  const fluxArea = ws.fluxArea;
  const fluxLeft = ws.fluxLeft;
  const fluxRight = ws.fluxRight;
  const n = ws.n;
  const ratio = both(dt / ws.dx);
  const mostExplicit = both(MOST_EXPLICIT);
  const half = both(0.5);
  let i = 1;
  for (; i < n; i += 2) {
    const old = pairAt(area, i);
    const q0 = pairAt(flow, i);
    const a = sub(old, mul(ratio, sub(pairAt(fluxArea, i), pairAt(fluxArea, i - 1))));
    if (!holds(isEasy(i, a, old))) {
      predictOne(i, dt);
      predictOne(i + 1, dt);
      continue;
    }
    const q = sub(q0, mul(ratio, sub(pairAt(fluxLeft, i), pairAt(fluxRight, i - 1))));
    const brake = mul(mul(both(0.5 * dt), pairAt(friction, i)), size(q0));
    const isMild = below(brake, mostExplicit);
    let share = half;
    if (!holds(isMild)) {
      share = choose(half, sub(both(1), div(both(0.5 * MOST_EXPLICIT), brake)), isMild);
    }
    putPair(ws.implicitShare, i, share);
    const e = lesser(mostExplicit, brake);
    putPair(ws.halfFlow, i, sub(mul(half, add(q0, q)), mul(e, q0)));
    putPair(ws.oldArea, i, old);
    placePair(i, a);
    putPair(flow, i, braked(i, q, mul(both(4 * dt), pairAt(friction, i))));
  }
  if (i === n) predictOne(i, dt);
}

export function correct(dt: f64): i32 {
  put(ws.lateralSums, 0, 0);
  put(ws.lateralSums, 1, 0);
  const area = ws.area;
  const oldArea = ws.oldArea;
  const fluxArea = ws.fluxArea;
  const fluxLeft = ws.fluxLeft;
  const fluxRight = ws.fluxRight;
  const n = ws.n;
  const ratio = both(dt / ws.dx);
  const halfRatio = both(0.5 * (dt / ws.dx));
  const half = both(0.5);
  let drained = 0;
  let i = 1;
  for (; i < n; i += 2) {
    const before = pairAt(area, i);
    const old = pairAt(oldArea, i);
    const end = sub(before, mul(ratio, sub(pairAt(fluxArea, i), pairAt(fluxArea, i - 1))));
    const a = mul(half, add(old, end));
    const keeps = and(upTo(both(0), end), upTo(mul(half, old), a));
    if (!holds(and(keeps, isEasy(i, a, before)))) {
      drained += correctOne(i, dt) as i32;
      drained += correctOne(i + 1, dt) as i32;
      continue;
    }
    const change = sub(pairAt(fluxLeft, i), pairAt(fluxRight, i - 1));
    const q = sub(pairAt(ws.halfFlow, i), mul(halfRatio, change));
    placePair(i, a);
    const stiff = mul(both(4 * dt), pairAt(ws.implicitShare, i));
    putPair(ws.flow, i, braked(i, q, mul(stiff, pairAt(ws.friction, i))));
  }
  if (i === n) drained += correctOne(i, dt) as i32;
  return drained;
}
