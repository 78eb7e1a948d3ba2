import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';

/** Fields of `workspace.face`: areas and thrusts of cells i and j at the stages left and right of a face. */
export const FACE_LAYOUT = {
  /** A_i(η_L), m² */
  A1: 0,
  /** A_j(η_L) */
  B1: 1,
  /** A_i(η_R) */
  A2: 2,
  /** A_j(η_R) */
  B2: 3,
  /** I1_i(η_R) - I1_i(η_L), m³ */
  DP_I: 4,
  /** I1_j(η_R) - I1_j(η_L) */
  DP_J: 5,
} as const;

/** Fills `workspace.face` from the tables, for stages too far from the cells' own for the local quadratic. */
export function createFaceAreas(
  { face }: Workspace,
  tables: CellTables,
): (i: number, j: number, left: number, right: number) => void {
  const { A1, B1, A2, B2, DP_I, DP_J } = FACE_LAYOUT;

  return function faceAreas(i, j, left, right) {
    face[A1] = tables.areaAt(i, left);
    face[B1] = tables.areaAt(j, left);
    face[A2] = tables.areaAt(i, right);
    face[B2] = tables.areaAt(j, right);
    face[DP_I] = tables.thrustAt(i, right) - tables.thrustAt(i, left);
    face[DP_J] = tables.thrustAt(j, right) - tables.thrustAt(j, left);
  };
}
