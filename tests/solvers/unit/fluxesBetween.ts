import { createInteriorFluxes } from '../../../server/solvers/riemann/interiorFluxes';
import type { SectionInput } from '../../../shared/case/caseFile';
import { at, kernelParts } from './kernelParts';

/** Two cells of one section, states left and right given by stage (m) and velocity (m/s); the fluxes at their face. */
export function fluxesBetween(
  section: SectionInput,
  left: [number, number],
  right: [number, number],
) {
  const { workspace, tables, state } = kernelParts(at(section, 0), at(section, 20), 2);
  [left, right].forEach(([stage, velocity], k) => {
    state.placeAtStage(k + 1, stage);
    workspace.flow[k + 1] = velocity * workspace.area[k + 1];
  });
  createInteriorFluxes(workspace, tables)();
  const { fluxArea, fluxLeft, fluxRight, area, celerity, width } = workspace;
  return {
    volume: fluxArea[1],
    left: fluxLeft[1],
    right: fluxRight[1],
    area: [...area],
    celerity: [...celerity],
    width: [...width],
  };
}
