import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import { FACE_LAYOUT, createFaceAreas } from './faceAreas';
import { createIrregularFlux } from './irregularFlux';

/** Sections whose areas at equal stage differ by less than this ratio make a regular face … */
const REGULAR = 1.5;
/** … and by more than this an irregular one; in between the fluxes are mixed. */
const IRREGULAR = 3;

/**
 * Where the stage slopes by more than this share of A/(2B) over a cell, as in the thin tongue of a front, the velocity
 * at the face stays within c of those of its cells: slopes of stage and flow apart can make any velocity of a small area.
 */
const THIN = 0.5;

const THIRD = 1 / 3;

/**
 * Volume and momentum fluxes at all faces between cells.
 *
 * Regular faces take the mean section of both cells, A(η) = (A_i + A_j)/2, and the HLL solver of Harten, Lax and van
 * Leer (1983), SIAM Rev. 25, 35-61, in stage and flow: the diffusion of the area uses the stage difference alone, so
 * that still water is kept whatever the sections do, and the momentum is counted from the pressure left of the face.
 * What the pressure does inside a cell, g ∫ A dη from its middle to the face, is added to the flux that the cell feels.
 */
export function createInteriorFluxes(workspace: Workspace, tables: CellTables): () => void {
  const { n, gravity, area, flow, stage, width, celerity, reach, levelB1 } = workspace;
  const { slopeStage, slopeFlow, fluxArea, fluxLeft, fluxRight, face } = workspace;
  const { A1, B1, A2, B2, DP_I, DP_J } = FACE_LAYOUT;
  const faceAreas = createFaceAreas(workspace, tables);
  const irregularFlux = createIrregularFlux(workspace, tables);
  const { abs, min, max } = Math;
  const halfG = 0.5 * gravity;

  return function interiorFluxes(): void {
    for (let i = 1; i < n; i++) {
      const j = i + 1;
      const areaI = area[i];
      const areaJ = area[j];
      if (areaI === 0 && areaJ === 0) {
        fluxArea[i] = 0;
        fluxLeft[i] = 0;
        fluxRight[i] = 0;
        continue;
      }
      const etaI = stage[i];
      const etaJ = stage[j];
      const etaL = etaI + 0.5 * slopeStage[i];
      const etaR = etaJ - 0.5 * slopeStage[j];
      const iL = etaL - etaI;
      const iR = etaR - etaI;
      const jL = etaL - etaJ;
      const jR = etaR - etaJ;
      const reachI = reach[i];
      const reachJ = reach[j];
      let a1, b1, a2, b2, dPi, dPj;
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
        const wI = width[i];
        const wJ = width[j];
        const kI = levelB1[i];
        const kJ = levelB1[j];
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
        faceAreas(i, j, etaL, etaR);
        a1 = face[A1];
        b1 = face[B1];
        a2 = face[A2];
        b2 = face[B2];
        dPi = face[DP_I];
        dPj = face[DP_J];
      }
      const isRegular =
        a1 > 0 &&
        a2 > 0 &&
        a1 <= REGULAR * b1 &&
        b1 <= REGULAR * a1 &&
        a2 <= REGULAR * b2 &&
        b2 <= REGULAR * a2;
      let mix = 0;
      if (!isRegular) {
        const ratio = max(a1 / b1, b1 / a1, a2 / b2, b2 / a2);
        mix = ratio < IRREGULAR ? (ratio - REGULAR) / (IRREGULAR - REGULAR) : 1;
        irregularFlux(i);
        if (mix === 1) continue;
      }

      const aL = 0.5 * (a1 + b1);
      const aR = 0.5 * (a2 + b2);
      let qL = flow[i] + 0.5 * slopeFlow[i];
      let qR = flow[j] - 0.5 * slopeFlow[j];
      const cI = celerity[i];
      const cJ = celerity[j];
      const isThinI = iL > THIN * reachI || iL < -THIN * reachI;
      const isThinJ = jR > THIN * reachJ || jR < -THIN * reachJ;
      if (isThinI || isThinJ) {
        const uI = areaI > 0 ? flow[i] / areaI : 0;
        const uJ = areaJ > 0 ? flow[j] / areaJ : 0;
        const low = min(uI, uJ);
        const high = max(uI, uJ);
        if (isThinI) qL = max((low - cI) * aL, min((high + cI) * aL, qL));
        if (isThinJ) qR = max((low - cJ) * aR, min((high + cJ) * aR, qR));
      }
      const uL = qL / aL;
      const uR = qR / aR;
      const sL = min(0, uL - cI, uR - cJ);
      const sR = max(0, uL + cI, uR + cJ);
      const dAi = a2 - a1;
      const dAj = b2 - b1;
      const dA = abs(dAi) < abs(dAj) ? dAi : dAj;
      const dP = halfG * (dPi + dPj);
      const inverse = 1 / (sR - sL);
      const product = sL * sR;
      const volume = (sR * qL - sL * qR + product * dA) * inverse;
      const momentum = (sR * qL * uL - sL * (qR * uR + dP) + product * (qR - qL)) * inverse;
      const left = momentum + halfG * iL * (areaI + aL);
      const right = momentum - dP + halfG * jR * (areaJ + aR);
      if (mix === 0) {
        fluxArea[i] = volume;
        fluxLeft[i] = left;
        fluxRight[i] = right;
      } else {
        fluxArea[i] = volume + mix * (fluxArea[i] - volume);
        fluxLeft[i] = left + mix * (fluxLeft[i] - left);
        fluxRight[i] = right + mix * (fluxRight[i] - right);
      }
    }
  };
}
