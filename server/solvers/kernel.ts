import type { CellState } from './geometry/cellState';
import type { CellTables } from './geometry/cellTables';
import { createLimitedSlopes } from './reconstruction/limitedSlopes';
import { createInteriorFluxes } from './riemann/interiorFluxes';
import { createPartedFluxes } from './riemann/partedFluxes';
import type { Laterals } from './sources/laterals';
import { createLimitOutflow } from './time/limitOutflow';
import { createStepLoops } from './time/stepLoops';
import { createFastestWave } from './time/fastestWave';
import { createPartedFastestWave } from './time/partedFastestWave';
import type { Workspace } from './workspace';

/**
 * The loops over cells and faces, where a run spends its time; all work on the arrays of the workspace. There are two of
 * them, which give the same bits: the one below, to be read, and fast/fastKernel.ts, which runs where it can.
 */
export interface Kernel {
  /** Limited slopes of all cells: reconstruction/limitedSlopes.ts */
  slopes(): void;
  /** Fluxes at all faces between cells: riemann/interiorFluxes.ts */
  fluxes(): void;
  /** time/limitOutflow.ts */
  limitOutflow(dt: number): void;
  /** time/stepLoops.ts */
  predict(dt: number): void;
  correct(dt: number): number;
  /** time/fastestWave.ts */
  fastestWave(): number;
}

export function createReferenceKernel(
  workspace: Workspace,
  tables: CellTables,
  cellState: CellState,
  laterals: Laterals,
): Kernel {
  const { parts } = workspace;
  return {
    slopes: createLimitedSlopes(workspace),
    fluxes: parts
      ? createPartedFluxes(workspace, tables, parts)
      : createInteriorFluxes(workspace, tables),
    limitOutflow: createLimitOutflow(workspace),
    ...createStepLoops(workspace, cellState, laterals),
    fastestWave: parts ? createPartedFastestWave(workspace, parts) : createFastestWave(workspace),
  };
}
