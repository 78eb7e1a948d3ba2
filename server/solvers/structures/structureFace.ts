import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import { createRelease, type Release } from './release';
import type { Structure } from './structure';
import { createWaterSide } from './waterSide';

/** The boundary between two cells at which structures stand. */
export interface StructureFace {
  readonly face: number;
  readonly structures: readonly Structure[];
  readonly release: Release;
  /** Slopes of the cells on both sides, after those of the reach */
  slopes(): void;
  /** Fluxes through the face at a time (s); returns the fastest wave there (m/s) */
  fluxes(time: number): number;
}

/** One flow for the cells on both sides; each feels the pressure of its own water. */
export function createStructureFace(
  workspace: Workspace,
  tables: CellTables,
  face: number,
  structures: readonly Structure[],
): StructureFace {
  const { fluxArea } = workspace;
  const left = createWaterSide(workspace, tables, face, face);
  const right = createWaterSide(workspace, tables, face, face + 1);
  const release = createRelease(structures, left, right, face, face + 1);

  return {
    face,
    structures,
    release,
    slopes() {
      left.slope();
      right.slope();
    },
    fluxes(time) {
      left.look();
      right.look();
      const flow = release.solve(time);
      fluxArea[face] = flow;
      return Math.max(left.enter(flow), right.enter(flow));
    },
  };
}
