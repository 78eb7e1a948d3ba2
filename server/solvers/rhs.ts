import type { Boundary } from './boundaries/boundary';
import type { CellTables } from './geometry/cellTables';
import { createLimitedSlopes } from './reconstruction/limitedSlopes';
import { createInteriorFluxes } from './riemann/interiorFluxes';
import type { StructureSet } from './structures/structureSet';
import type { Workspace } from './workspace';

/**
 * The fluxes of the present state at a time (s), into the workspace; returns the fastest wave at the ends and structures (m/s).
 * Friction and laterals act where a step is made: time/steps.ts.
 */
export type Rhs = (time: number) => number;

export function createRhs(
  workspace: Workspace,
  tables: CellTables,
  upstream: Boundary,
  downstream: Boundary,
  order: 1 | 2,
  structures: StructureSet | null = null,
): Rhs {
  const limitedSlopes = createLimitedSlopes(workspace);
  const interiorFluxes = createInteriorFluxes(workspace, tables);

  return function rhs(time) {
    if (order === 2) {
      limitedSlopes();
      structures?.slopes();
    }
    interiorFluxes();
    const endSpeed = Math.max(upstream(time), downstream(time));
    return structures ? Math.max(endSpeed, structures.fluxes(time)) : endSpeed;
  };
}
