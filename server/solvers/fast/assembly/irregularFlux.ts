/** The flux at a face between unlike sections, or beside dry ground, as riemann/irregularFlux.ts. */
import * as ws from './arrays';
import { at, put } from './lanes';
import { areaAt, frontSpeedAt, thrustAt } from './tables';

const STILL: f64 = 1e-12;

export function irregularFlux(f: i32): void {
  const i = f;
  const j = f + 1;
  const gravity = ws.gravity;
  const etaI = at(ws.stage, i);
  const etaJ = at(ws.stage, j);
  const a1 = areaAt(i, etaI);
  const b1 = areaAt(j, etaI);
  const a2 = areaAt(i, etaJ);
  const b2 = areaAt(j, etaJ);
  const dPi = thrustAt(i, etaJ) - thrustAt(i, etaI);
  const dPj = thrustAt(j, etaJ) - thrustAt(j, etaI);
  const own = min<f64>(a1, b2);
  const areaI = at(ws.area, i);
  const areaJ = at(ws.area, j);
  const uI = areaI > 0 ? at(ws.flow, i) / areaI : 0;
  const uJ = areaJ > 0 ? at(ws.flow, j) / areaJ : 0;
  let aL = min<f64>(a1, b1);
  let aR = min<f64>(a2, b2);
  if (etaI >= etaJ) {
    if (uJ >= 0) aR = own;
  } else if (uI <= 0) aL = own;

  const thrust = gravity * (abs<f64>(dPi) < abs<f64>(dPj) ? dPi : dPj);
  const step = gravity * own * (etaJ - etaI);
  const dP = abs<f64>(thrust) > abs<f64>(step) ? thrust : step;

  const cI = at(ws.celerity, i);
  const cJ = at(ws.celerity, j);
  let sL = min<f64>(min<f64>(0, uI - cI), uJ - cJ);
  let sR = max<f64>(max<f64>(0, uI + cI), uJ + cJ);
  if (etaJ - at(ws.bed, j) <= ws.dryDepth) sR = max<f64>(sR, uI + frontSpeedAt(i, etaI));
  if (etaI - at(ws.bed, i) <= ws.dryDepth) sL = min<f64>(sL, uJ - frontSpeedAt(j, etaJ));
  const spread = sR - sL;
  const qL = aL * uI;
  const qR = aR * uJ;
  let momentum: f64 = 0;
  let volume: f64 = 0;
  if (spread > STILL) {
    volume = (sR * qL - sL * qR + sL * sR * (aR - aL)) / spread;
    momentum = (sR * qL * uI - sL * (qR * uJ + dP) + sL * sR * (qR - qL)) / spread;
  }
  put(ws.fluxArea, f, volume);
  put(ws.fluxLeft, f, momentum);
  put(ws.fluxRight, f, momentum - dP);
}
