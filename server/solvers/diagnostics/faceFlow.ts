import type { Workspace } from '../workspace';

/**
 * The flow past each face at the start of a step, into `workspace.faceFlow` (m³/s).
 *
 * What moves the volume is the mean of the fluxes of both stages of a step. Either alone can be off by 1e-4 where a slope
 * limiter switches between the stages, even in steady flow. The second stage of the step that has just ended and the
 * first of the step that begins stand at the same moment: their mean is the flow then, without a lag. At the very first
 * moment there is one flux only.
 */
export interface FaceFlow {
  /** After the last stage of a step, before other fluxes take the place of its own */
  keep(): void;
  /** After the first fluxes of a step */
  follow(): void;
}

export function createFaceFlow(
  { n, fluxArea, lateFlux, faceFlow }: Workspace,
  order: 1 | 2,
): FaceFlow {
  let isKept = false;

  return {
    keep() {
      // An Euler step has its start only.
      if (order === 1) return;
      lateFlux.set(fluxArea);
      isKept = true;
    },
    follow() {
      if (!isKept) faceFlow.set(fluxArea);
      else for (let f = 0; f <= n; f++) faceFlow[f] = 0.5 * (lateFlux[f] + fluxArea[f]);
    },
  };
}
