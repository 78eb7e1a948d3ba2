/** The fluxes of one face, whatever it is like, as riemann/interiorFluxes.ts. */
import * as ws from './arrays';
import { irregularFlux } from './irregularFlux';
import { at, put } from './lanes';
import { areaAt, thrustAt } from './tables';

export const REGULAR: f64 = 1.5;
const IRREGULAR: f64 = 3;
export const THIN: f64 = 0.5;
export const THIRD: f64 = 1.0 / 3.0;

export function fluxOf(i: i32): void {
  const j = i + 1;
  const areaI = at(ws.area, i);
  const areaJ = at(ws.area, j);
  if (areaI === 0 && areaJ === 0) {
    put(ws.fluxArea, i, 0);
    put(ws.fluxLeft, i, 0);
    put(ws.fluxRight, i, 0);
    return;
  }
  const halfG = 0.5 * ws.gravity;
  const etaI = at(ws.stage, i);
  const etaJ = at(ws.stage, j);
  const etaL = etaI + 0.5 * at(ws.slopeStage, i);
  const etaR = etaJ - 0.5 * at(ws.slopeStage, j);
  const iL = etaL - etaI;
  const iR = etaR - etaI;
  const jL = etaL - etaJ;
  const jR = etaR - etaJ;
  const reachI = at(ws.reach, i);
  const reachJ = at(ws.reach, j);
  let a1: f64, b1: f64, a2: f64, b2: f64, dPi: f64, dPj: f64;
  if (
    iL <= reachI &&
    iL >= -reachI &&
    iR <= reachI &&
    iR >= -reachI &&
    jL <= reachJ &&
    jL >= -reachJ &&
    jR <= reachJ &&
    jR >= -reachJ
  ) {
    const wI = at(ws.width, i);
    const wJ = at(ws.width, j);
    const kI = at(ws.levelB1, i);
    const kJ = at(ws.levelB1, j);
    a1 = areaI + iL * (wI + iL * kI);
    a2 = areaI + iR * (wI + iR * kI);
    b1 = areaJ + jL * (wJ + jL * kJ);
    b2 = areaJ + jR * (wJ + jR * kJ);
    dPi =
      iR * (areaI + iR * (0.5 * wI + iR * THIRD * kI)) -
      iL * (areaI + iL * (0.5 * wI + iL * THIRD * kI));
    dPj =
      jR * (areaJ + jR * (0.5 * wJ + jR * THIRD * kJ)) -
      jL * (areaJ + jL * (0.5 * wJ + jL * THIRD * kJ));
  } else {
    a1 = areaAt(i, etaL);
    b1 = areaAt(j, etaL);
    a2 = areaAt(i, etaR);
    b2 = areaAt(j, etaR);
    dPi = thrustAt(i, etaR) - thrustAt(i, etaL);
    dPj = thrustAt(j, etaR) - thrustAt(j, etaL);
  }
  const isRegular =
    a1 > 0 &&
    a2 > 0 &&
    a1 <= REGULAR * b1 &&
    b1 <= REGULAR * a1 &&
    a2 <= REGULAR * b2 &&
    b2 <= REGULAR * a2;
  let mix: f64 = 0;
  if (!isRegular) {
    const ratio = max<f64>(max<f64>(a1 / b1, b1 / a1), max<f64>(a2 / b2, b2 / a2));
    mix = ratio < IRREGULAR ? (ratio - REGULAR) / (IRREGULAR - REGULAR) : 1;
    irregularFlux(i);
    if (mix === 1) return;
  }

  const aL = 0.5 * (a1 + b1);
  const aR = 0.5 * (a2 + b2);
  const flowI = at(ws.flow, i);
  const flowJ = at(ws.flow, j);
  let qL = flowI + 0.5 * at(ws.slopeFlow, i);
  let qR = flowJ - 0.5 * at(ws.slopeFlow, j);
  const cI = at(ws.celerity, i);
  const cJ = at(ws.celerity, j);
  const isThinI = iL > THIN * reachI || iL < -THIN * reachI;
  const isThinJ = jR > THIN * reachJ || jR < -THIN * reachJ;
  if (isThinI || isThinJ) {
    const uI = areaI > 0 ? flowI / areaI : 0;
    const uJ = areaJ > 0 ? flowJ / areaJ : 0;
    const low = min<f64>(uI, uJ);
    const high = max<f64>(uI, uJ);
    if (isThinI) qL = max<f64>((low - cI) * aL, min<f64>((high + cI) * aL, qL));
    if (isThinJ) qR = max<f64>((low - cJ) * aR, min<f64>((high + cJ) * aR, qR));
  }
  const uL = qL / aL;
  const uR = qR / aR;
  const sL = min<f64>(min<f64>(0, uL - cI), uR - cJ);
  const sR = max<f64>(max<f64>(0, uL + cI), uR + cJ);
  const dAi = a2 - a1;
  const dAj = b2 - b1;
  const dA = abs<f64>(dAi) < abs<f64>(dAj) ? dAi : dAj;
  const dP = halfG * (dPi + dPj);
  const inverse = 1 / (sR - sL);
  const product = sL * sR;
  const volume = (sR * qL - sL * qR + product * dA) * inverse;
  const momentum = (sR * qL * uL - sL * (qR * uR + dP) + product * (qR - qL)) * inverse;
  const left = momentum + halfG * iL * (areaI + aL);
  const right = momentum - dP + halfG * jR * (areaJ + aR);
  if (mix === 0) {
    put(ws.fluxArea, i, volume);
    put(ws.fluxLeft, i, left);
    put(ws.fluxRight, i, right);
  } else {
    put(ws.fluxArea, i, volume + mix * (at(ws.fluxArea, i) - volume));
    put(ws.fluxLeft, i, left + mix * (at(ws.fluxLeft, i) - left));
    put(ws.fluxRight, i, right + mix * (at(ws.fluxRight, i) - right));
  }
}
