/** Fluxes at all faces between cells: two at once where both are regular and wet, else one by one. */
import * as ws from './arrays';
import { fluxOf, REGULAR, THIN, THIRD } from './fluxOf';
import {
  add,
  and,
  below,
  both,
  choose,
  div,
  greater,
  holds,
  lesser,
  mul,
  pairAt,
  putPair,
  size,
  sub,
  upTo,
} from './lanes';

/** d (A + d (B/2 + d b1/3)): what the thrust grows by over a rise d of the stage */
function thrustOver(d: v128, area: v128, halfWidth: v128, k: v128): v128 {
  return mul(d, add(area, mul(d, add(halfWidth, mul(mul(d, both(THIRD)), k)))));
}

export function fluxes(): void {
  const area = ws.area;
  const flow = ws.flow;
  const stage = ws.stage;
  const width = ws.width;
  const celerity = ws.celerity;
  const reach = ws.reach;
  const levelB1 = ws.levelB1;
  const slopeStage = ws.slopeStage;
  const slopeFlow = ws.slopeFlow;
  const fluxArea = ws.fluxArea;
  const fluxLeft = ws.fluxLeft;
  const fluxRight = ws.fluxRight;
  const n = ws.n;
  const zero = both(0);
  const half = both(0.5);
  const regular = both(REGULAR);
  const thin = both(THIN);
  const halfG = both(0.5 * ws.gravity);
  let i = 1;
  for (; i + 1 < n; i += 2) {
    const j = i + 1;
    const areaI = pairAt(area, i);
    const areaJ = pairAt(area, j);
    const etaI = pairAt(stage, i);
    const etaJ = pairAt(stage, j);
    const etaL = add(etaI, mul(half, pairAt(slopeStage, i)));
    const etaR = sub(etaJ, mul(half, pairAt(slopeStage, j)));
    const iL = sub(etaL, etaI);
    const iR = sub(etaR, etaI);
    const jL = sub(etaL, etaJ);
    const jR = sub(etaR, etaJ);
    const reachI = pairAt(reach, i);
    const reachJ = pairAt(reach, j);
    const wI = pairAt(width, i);
    const wJ = pairAt(width, j);
    const kI = pairAt(levelB1, i);
    const kJ = pairAt(levelB1, j);
    const a1 = add(areaI, mul(iL, add(wI, mul(iL, kI))));
    const a2 = add(areaI, mul(iR, add(wI, mul(iR, kI))));
    const b1 = add(areaJ, mul(jL, add(wJ, mul(jL, kJ))));
    const b2 = add(areaJ, mul(jR, add(wJ, mul(jR, kJ))));
    const isNear = and(
      and(upTo(size(iL), mul(thin, reachI)), upTo(size(iR), reachI)),
      and(upTo(size(jR), mul(thin, reachJ)), upTo(size(jL), reachJ)),
    );
    const isRegular = and(
      and(upTo(a1, mul(regular, b1)), upTo(b1, mul(regular, a1))),
      and(upTo(a2, mul(regular, b2)), upTo(b2, mul(regular, a2))),
    );
    const isWet = below(zero, lesser(lesser(areaI, areaJ), lesser(a1, a2)));
    if (!holds(and(isNear, and(isRegular, isWet)))) {
      fluxOf(i);
      fluxOf(j);
      continue;
    }
    const halfI = mul(half, wI);
    const halfJ = mul(half, wJ);
    const dPi = sub(thrustOver(iR, areaI, halfI, kI), thrustOver(iL, areaI, halfI, kI));
    const dPj = sub(thrustOver(jR, areaJ, halfJ, kJ), thrustOver(jL, areaJ, halfJ, kJ));
    const aL = mul(half, add(a1, b1));
    const aR = mul(half, add(a2, b2));
    const qL = add(pairAt(flow, i), mul(half, pairAt(slopeFlow, i)));
    const qR = sub(pairAt(flow, j), mul(half, pairAt(slopeFlow, j)));
    const uL = div(qL, aL);
    const uR = div(qR, aR);
    const cI = pairAt(celerity, i);
    const cJ = pairAt(celerity, j);
    const sL = lesser(lesser(zero, sub(uL, cI)), sub(uR, cJ));
    const sR = greater(greater(zero, add(uL, cI)), add(uR, cJ));
    const dAi = sub(a2, a1);
    const dAj = sub(b2, b1);
    const dA = choose(dAi, dAj, below(size(dAi), size(dAj)));
    const dP = mul(halfG, add(dPi, dPj));
    const inverse = div(both(1), sub(sR, sL));
    const product = mul(sL, sR);
    const volume = mul(add(sub(mul(sR, qL), mul(sL, qR)), mul(product, dA)), inverse);
    const carried = sub(mul(mul(sR, qL), uL), mul(sL, add(mul(qR, uR), dP)));
    const momentum = mul(add(carried, mul(product, sub(qR, qL))), inverse);
    putPair(fluxArea, i, volume);
    putPair(fluxLeft, i, add(momentum, mul(mul(halfG, iL), add(areaI, aL))));
    putPair(fluxRight, i, add(sub(momentum, dP), mul(mul(halfG, jR), add(areaJ, aR))));
  }
  if (i < n) fluxOf(i);
}
