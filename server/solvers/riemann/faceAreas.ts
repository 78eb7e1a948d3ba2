import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';

/** Fields of `workspace.face`: areas of the sections of cells i and j at the stages left and right of a face. */
export const A1 = 0; // A_i(η_L), m²
export const B1 = 1; // A_j(η_L)
export const A2 = 2; // A_i(η_R)
export const B2 = 3; // A_j(η_R)
export const DP_I = 4; // I1_i(η_R) - I1_i(η_L), m³
export const DP_J = 5; // I1_j(η_R) - I1_j(η_L)

/** Fills `workspace.face` from the tables, for stages too far from the cells' own for the local quadratic. */
export function createFaceAreas(
  { face }: Workspace,
  tables: CellTables,
): (i: number, j: number, left: number, right: number) => void {
  return function faceAreas(i, j, left, right) {
    face[A1] = tables.areaAt(i, left);
    face[B1] = tables.areaAt(j, left);
    face[A2] = tables.areaAt(i, right);
    face[B2] = tables.areaAt(j, right);
    face[DP_I] = tables.thrustAt(i, right) - tables.thrustAt(i, left);
    face[DP_J] = tables.thrustAt(j, right) - tables.thrustAt(j, left);
  };
}
