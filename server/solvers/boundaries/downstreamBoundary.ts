import type { Downstream } from '../../../shared/case/caseFile';
import type { CellTables } from '../geometry/cellTables';
import { createSeries } from '../sources/series';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { createControlBoundary } from './controlBoundary';
import { createEndSection } from './endSection';
import { downstreamEnd } from './endState';
import { createOpenBoundary } from './openBoundary';
import { createRatingCurve } from './ratingCurve';
import { createStageBoundary } from './stageBoundary';
import { createWallBoundary } from './wallBoundary';

export function createDownstreamBoundary(
  workspace: Workspace,
  tables: CellTables,
  downstream: Downstream,
): Boundary {
  const end = downstreamEnd(workspace.n);
  const control = outletControl(workspace, tables, downstream);
  if (control) return createControlBoundary(workspace, tables, end, control);
  switch (downstream.kind) {
    case 'stage':
      return createStageBoundary(
        workspace,
        tables,
        end,
        createSeries(downstream.times, downstream.stages),
      );
    case 'open':
      return createOpenBoundary(workspace, tables, end);
    default:
      return createWallBoundary(workspace, tables, end);
  }
}

/** The flow (m³/s) that an outlet lets out at a stage (m); null where its condition is not of that kind. */
export function outletControl(
  workspace: Workspace,
  tables: CellTables,
  downstream: Downstream,
): ((stage: number) => number) | null {
  const section = workspace.n + 1;
  switch (downstream.kind) {
    case 'normalDepth': {
      const root = Math.sqrt(downstream.slope);
      return (stage) => tables.conveyanceAt(section, stage) * root;
    }
    case 'rating':
      return createRatingCurve(downstream.stages, downstream.flows, workspace.bed[section]);
    case 'criticalDepth':
      return createEndSection(workspace, tables, section).criticalFlowAt;
    default:
      return null;
  }
}
