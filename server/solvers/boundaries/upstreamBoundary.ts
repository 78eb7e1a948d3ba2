import type { Upstream } from '../../../shared/case/caseFile';
import type { CellTables } from '../geometry/cellTables';
import { createSeries } from '../sources/series';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { upstreamEnd } from './endState';
import { createInflowBoundary } from './inflowBoundary';
import { createStageBoundary } from './stageBoundary';
import { createWallBoundary } from './wallBoundary';

export function createUpstreamBoundary(
  workspace: Workspace,
  tables: CellTables,
  upstream: Upstream,
): Boundary {
  switch (upstream.kind) {
    case 'inflow':
      return createInflowBoundary(workspace, tables, createSeries(upstream.times, upstream.flows));
    case 'stage':
      return createStageBoundary(
        workspace,
        tables,
        upstreamEnd(),
        createSeries(upstream.times, upstream.stages),
      );
    // The pool of a reservoir makes its own end: structures/reservoirBoundary.ts.
    case 'reservoir':
    case 'wall':
      return createWallBoundary(workspace, tables, upstreamEnd());
  }
}
