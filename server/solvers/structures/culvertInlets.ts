import type { CulvertInlet } from '../../../shared/case/structures';

/** Constants of an inlet: form of its curve while unsubmerged, K and M of it, c and Y of the submerged one, K_e. */
export interface InletConstants {
  form: 1 | 2;
  K: number;
  M: number;
  c: number;
  Y: number;
  /** Entrance loss of full flow, in velocity heads */
  loss: number;
  isMitered?: boolean;
}

/**
 * J. D. Schall et al. (2012), Hydraulic Design of Highway Culverts, 3rd ed., FHWA-HIF-12-026 (HDS-5), appendix A; chart
 * and scale behind each. Constants from memory but those of 8-1 to 8-3, which were seen in a public spreadsheet.
 */
export const CULVERT_INLETS: Record<CulvertInlet, InletConstants> = {
  // 1-1
  concretePipeSquareEdge: { form: 1, K: 0.0098, M: 2, c: 0.0398, Y: 0.67, loss: 0.5 },
  // 1-2
  concretePipeGrooveHeadwall: { form: 1, K: 0.0018, M: 2, c: 0.0292, Y: 0.74, loss: 0.2 },
  // 1-3
  concretePipeGrooveProjecting: { form: 1, K: 0.0045, M: 2, c: 0.0317, Y: 0.69, loss: 0.2 },
  // 2-1
  metalPipeHeadwall: { form: 1, K: 0.0078, M: 2, c: 0.0379, Y: 0.69, loss: 0.5 },
  // 2-2
  metalPipeMitered: { form: 1, K: 0.021, M: 1.33, c: 0.0463, Y: 0.75, loss: 0.7, isMitered: true },
  // 2-3
  metalPipeProjecting: { form: 1, K: 0.034, M: 1.5, c: 0.0553, Y: 0.54, loss: 0.9 },
  // 3-A
  pipeBeveledRing: { form: 1, K: 0.0018, M: 2.5, c: 0.03, Y: 0.74, loss: 0.2 },
  // 8-1
  boxWingwalls30to75: { form: 1, K: 0.026, M: 1, c: 0.0347, Y: 0.81, loss: 0.4 },
  // 8-2
  boxWingwalls90or15: { form: 1, K: 0.061, M: 0.75, c: 0.04, Y: 0.8, loss: 0.5 },
  // 8-3
  boxWingwallsParallel: { form: 1, K: 0.061, M: 0.75, c: 0.0423, Y: 0.82, loss: 0.7 },
  // 9-1
  boxFlared45Beveled: { form: 2, K: 0.51, M: 0.667, c: 0.0309, Y: 0.8, loss: 0.2 },
  // 9-2
  boxFlared18to34Beveled: { form: 2, K: 0.486, M: 0.667, c: 0.0249, Y: 0.83, loss: 0.2 },
};
