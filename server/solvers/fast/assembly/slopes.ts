/** Limited slopes of the cells between two others, as reconstruction/limitedSlopes.ts, which does those at the ends. */
import * as ws from './arrays';
import {
  add,
  and,
  at,
  below,
  both,
  div,
  greater,
  lesser,
  mul,
  pairAt,
  put,
  putPair,
  sub,
} from './lanes';

/** Van Leer's limited difference */
function limited(low: v128, high: v128): v128 {
  const product = mul(low, high);
  return and(div(mul(both(2), product), add(low, high)), below(both(0), product));
}

export function slopes(): void {
  const stage = ws.stage;
  const flow = ws.flow;
  const reach = ws.reach;
  const slopeFloor = ws.slopeFloor;
  const slopeStage = ws.slopeStage;
  const slopeFlow = ws.slopeFlow;
  const n = ws.n;
  let i = 2;
  for (; i + 1 < n; i += 2) {
    const before = pairAt(stage, i - 1);
    const own = pairAt(stage, i);
    const after = pairAt(stage, i + 1);
    const floor = pairAt(slopeFloor, i);
    const isWet = below(floor, lesser(lesser(before, own), after));
    const most = mul(both(4), pairAt(reach, i));
    const s = and(limited(sub(own, before), sub(after, own)), isWet);
    putPair(slopeStage, i, greater(lesser(s, most), f64x2.neg(most)));
    const q = pairAt(flow, i);
    const t = limited(sub(q, pairAt(flow, i - 1)), sub(pairAt(flow, i + 1), q));
    putPair(slopeFlow, i, and(t, isWet));
  }
  if (i < n) slopeOf(i);
}

function limitedOne(low: f64, high: f64): f64 {
  const product = low * high;
  return product > 0 ? (2 * product) / (low + high) : 0;
}

function slopeOf(i: i32): void {
  const before = at(ws.stage, i - 1);
  const own = at(ws.stage, i);
  const after = at(ws.stage, i + 1);
  const floor = at(ws.slopeFloor, i);
  let s: f64 = 0;
  let t: f64 = 0;
  if (before > floor && own > floor && after > floor) {
    const most = 4 * at(ws.reach, i);
    s = limitedOne(own - before, after - own);
    if (s > most) s = most;
    else if (s < -most) s = -most;
    const q = at(ws.flow, i);
    t = limitedOne(q - at(ws.flow, i - 1), at(ws.flow, i + 1) - q);
  }
  put(ws.slopeStage, i, s);
  put(ws.slopeFlow, i, t);
}
