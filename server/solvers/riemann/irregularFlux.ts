import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import { FACE_LAYOUT, createFaceAreas } from './faceAreas';

const STILL = 1e-12;

/**
 * The flux at a face that is wet on one side only, or whose sections differ abruptly: from the states of the cells
 * themselves, through the smaller of both sections. Water at rest stays at rest, and water that falls over a step falls
 * with its own area. Writes the volume flux and the momentum fluxes of face `f` between cells f and f + 1.
 */
export function createIrregularFlux(workspace: Workspace, tables: CellTables): (f: number) => void {
  const { area, flow, stage, celerity, face, fluxArea, fluxLeft, fluxRight } = workspace;
  const { gravity, bed, dryDepth } = workspace;
  const { abs, min, max } = Math;
  const { A1, B1, A2, B2, DP_I, DP_J } = FACE_LAYOUT;
  const faceAreas = createFaceAreas(workspace, tables);

  return function irregularFlux(f: number): void {
    const i = f;
    const j = f + 1;
    const etaI = stage[i];
    const etaJ = stage[j];
    faceAreas(i, j, etaI, etaJ);
    const a1 = face[A1];
    const b2 = face[B2];
    const own = min(a1, b2);
    const uI = area[i] > 0 ? flow[i] / area[i] : 0;
    const uJ = area[j] > 0 ? flow[j] / area[j] : 0;
    let aL = min(a1, face[B1]);
    let aR = min(face[A2], b2);
    if (etaI >= etaJ) {
      if (uJ >= 0) aR = own;
    } else if (uI <= 0) aL = own;

    const thrust = gravity * smaller(face[DP_I], face[DP_J]);
    const step = gravity * own * (etaJ - etaI);
    const dP = abs(thrust) > abs(step) ? thrust : step;

    let sL = min(0, uI - celerity[i], uJ - celerity[j]);
    let sR = max(0, uI + celerity[i], uJ + celerity[j]);
    if (etaJ - bed[j] <= dryDepth) sR = max(sR, uI + tables.frontSpeedAt(i, etaI));
    if (etaI - bed[i] <= dryDepth) sL = min(sL, uJ - tables.frontSpeedAt(j, etaJ));
    const spread = sR - sL;
    const qL = aL * uI;
    const qR = aR * uJ;
    let momentum = 0;
    let volume = 0;
    if (spread > STILL) {
      volume = (sR * qL - sL * qR + sL * sR * (aR - aL)) / spread;
      momentum = (sR * qL * uI - sL * (qR * uJ + dP) + sL * sR * (qR - qL)) / spread;
    }
    fluxArea[f] = volume;
    fluxLeft[f] = momentum;
    fluxRight[f] = momentum - dP;
  };
}

function smaller(a: number, b: number): number {
  return Math.abs(a) < Math.abs(b) ? a : b;
}
