import type { CellTables } from '../geometry/cellTables';
import { emptyPart, LEAST_SPREAD, readPart, type Parts } from '../geometry/parts';
import { LEVEL_LAYOUT } from '../geometry/sectionTable';
import type { Workspace } from '../workspace';

/** As in interiorFluxes.ts, of the areas that flow. */
const REGULAR = 1.5;
const IRREGULAR = 3;
const THIN = 0.5;
const STILL = 1e-12;

/** What a section is at a stage: whole area, area that flows, its thrust ∫ A_f dη, momentum coefficient. */
interface Look {
  area: number;
  flows: number;
  thrust: number;
  beta: number;
}

const emptyLook = (): Look => ({ area: 0, flows: 0, thrust: 0, beta: 1 });

/**
 * The fluxes of interiorFluxes.ts and irregularFlux.ts where sections have parts that do not flow or a momentum
 * coefficient (geometry/parts.ts): momentum and pressure with the area that flows, volume and its diffusion with the whole.
 */
export function createPartedFluxes(
  workspace: Workspace,
  tables: CellTables,
  parts: Parts,
): () => void {
  const { n, gravity, area, flow, stage, celerity, reach, bed, dryDepth, table } = workspace;
  const { slopeStage, slopeFlow, fluxArea, fluxLeft, fluxRight } = workspace;
  const { flowArea, beta, spread } = parts;
  const { Z, AREA, B0, B1, THRUST } = LEVEL_LAYOUT;
  const { abs, min, max, sqrt } = Math;
  const halfG = 0.5 * gravity;
  const part = emptyPart();
  // Cell i (left) and j (right), at the stage left and right of the face.
  const iL = emptyLook();
  const jL = emptyLook();
  const iR = emptyLook();
  const jR = emptyLook();

  function look(i: number, eta: number, into: Look): void {
    const row = tables.rowAtStage(i, eta);
    const s = max(0, eta - table[row + Z]);
    readPart(parts, i, row, s, part);
    into.area = table[row + AREA] + s * (table[row + B0] + s * table[row + B1]);
    into.flows = part.area;
    into.beta = part.beta;
    into.thrust = table[row + THRUST] + part.thrust;
  }

  /** Half the distance of the waves of cell i about their drift, for a velocity v of what flows. */
  function waveOf(i: number, v: number): number {
    const c = celerity[i];
    const p = spread[i];
    return p === 0 ? c : sqrt(max(LEAST_SPREAD * c * c, c * c + p * v * v));
  }

  return function partedFluxes(): void {
    for (let i = 1; i < n; i++) {
      const j = i + 1;
      if (area[i] === 0 && area[j] === 0) {
        fluxArea[i] = 0;
        fluxLeft[i] = 0;
        fluxRight[i] = 0;
        continue;
      }
      const etaL = stage[i] + 0.5 * slopeStage[i];
      const etaR = stage[j] - 0.5 * slopeStage[j];
      look(i, etaL, iL);
      look(j, etaL, jL);
      look(i, etaR, iR);
      look(j, etaR, jR);
      const ratio =
        iL.flows > 0 && iR.flows > 0 && jL.flows > 0 && jR.flows > 0
          ? max(iL.flows / jL.flows, jL.flows / iL.flows, iR.flows / jR.flows, jR.flows / iR.flows)
          : Infinity;
      const mix = min(1, max(0, (ratio - REGULAR) / (IRREGULAR - REGULAR)));
      if (mix < 1) regular(i, j, etaL, etaR);
      if (mix > 0) irregular(i, j, mix);
    }
  };

  function regular(i: number, j: number, etaL: number, etaR: number): void {
    const aL = 0.5 * (iL.flows + jL.flows);
    const aR = 0.5 * (iR.flows + jR.flows);
    const betaL = 0.5 * (iL.beta + jL.beta);
    const betaR = 0.5 * (iR.beta + jR.beta);
    const fromI = etaL - stage[i];
    const fromJ = etaR - stage[j];
    let qL = flow[i] + 0.5 * slopeFlow[i];
    let qR = flow[j] - 0.5 * slopeFlow[j];
    const isThinI = abs(fromI) > THIN * reach[i];
    const isThinJ = abs(fromJ) > THIN * reach[j];
    if (isThinI || isThinJ) {
      const vI = flowArea[i] > 0 ? flow[i] / flowArea[i] : 0;
      const vJ = flowArea[j] > 0 ? flow[j] / flowArea[j] : 0;
      const low = min(vI, vJ);
      const high = max(vI, vJ);
      if (isThinI) qL = max((low - celerity[i]) * aL, min((high + celerity[i]) * aL, qL));
      if (isThinJ) qR = max((low - celerity[j]) * aR, min((high + celerity[j]) * aR, qR));
    }
    const vL = qL / aL;
    const vR = qR / aR;
    const sL = min(0, betaL * vL - waveOf(i, vL), betaR * vR - waveOf(j, vR));
    const sR = max(0, betaL * vL + waveOf(i, vL), betaR * vR + waveOf(j, vR));
    const dAi = iR.area - iL.area;
    const dAj = jR.area - jL.area;
    const dA = abs(dAi) < abs(dAj) ? dAi : dAj;
    const dP = halfG * (iR.thrust - iL.thrust + jR.thrust - jL.thrust);
    const inverse = 1 / (sR - sL);
    const product = sL * sR;
    const momentum =
      (sR * betaL * qL * vL - sL * (betaR * qR * vR + dP) + product * (qR - qL)) * inverse;
    fluxArea[i] = (sR * qL - sL * qR + product * dA) * inverse;
    fluxLeft[i] = momentum + halfG * fromI * (flowArea[i] + aL);
    fluxRight[i] = momentum - dP + halfG * fromJ * (flowArea[j] + aR);
  }

  /** Adds to what stands at the face by `mix`; wholly at 1. */
  function irregular(i: number, j: number, mix: number): void {
    const etaI = stage[i];
    const etaJ = stage[j];
    look(i, etaI, iL);
    look(j, etaI, jL);
    look(i, etaJ, iR);
    look(j, etaJ, jR);
    const vI = flowArea[i] > 0 ? flow[i] / flowArea[i] : 0;
    const vJ = flowArea[j] > 0 ? flow[j] / flowArea[j] : 0;
    let aL = min(iL.flows, jL.flows);
    let aR = min(iR.flows, jR.flows);
    let wholeL = min(iL.area, jL.area);
    let wholeR = min(iR.area, jR.area);
    const own = min(iL.flows, jR.flows);
    const wholeOwn = min(iL.area, jR.area);
    if (etaI >= etaJ) {
      if (vJ >= 0) {
        aR = own;
        wholeR = wholeOwn;
      }
    } else if (vI <= 0) {
      aL = own;
      wholeL = wholeOwn;
    }
    const dI = iR.thrust - iL.thrust;
    const dJ = jR.thrust - jL.thrust;
    const thrust = gravity * (abs(dI) < abs(dJ) ? dI : dJ);
    const step = gravity * own * (etaJ - etaI);
    const dP = abs(thrust) > abs(step) ? thrust : step;

    let sL = min(0, beta[i] * vI - waveOf(i, vI), beta[j] * vJ - waveOf(j, vJ));
    let sR = max(0, beta[i] * vI + waveOf(i, vI), beta[j] * vJ + waveOf(j, vJ));
    if (etaJ - bed[j] <= dryDepth) sR = max(sR, beta[i] * vI + tables.frontSpeedAt(i, etaI));
    if (etaI - bed[i] <= dryDepth) sL = min(sL, beta[j] * vJ - tables.frontSpeedAt(j, etaJ));
    const apart = sR - sL;
    const qL = aL * vI;
    const qR = aR * vJ;
    let momentum = 0;
    let volume = 0;
    if (apart > STILL) {
      const product = sL * sR;
      volume = (sR * qL - sL * qR + product * (wholeR - wholeL)) / apart;
      momentum =
        (sR * beta[i] * qL * vI - sL * (beta[j] * qR * vJ + dP) + product * (qR - qL)) / apart;
    }
    if (mix === 1) {
      fluxArea[i] = volume;
      fluxLeft[i] = momentum;
      fluxRight[i] = momentum - dP;
      return;
    }
    fluxArea[i] += mix * (volume - fluxArea[i]);
    fluxLeft[i] += mix * (momentum - fluxLeft[i]);
    fluxRight[i] += mix * (momentum - dP - fluxRight[i]);
  }
}
