import type { Boundary } from '../boundaries/boundary';
import { createInflowBoundary } from '../boundaries/inflowBoundary';
import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import type { LevelPool } from './levelPool';
import { createRelease, type Release } from './release';
import type { Structure } from './structure';
import { createWaterSide } from './waterSide';

/** Rise of the pool (m) by which the growth of its release is measured. */
const RISE = 0.01;

/**
 * The upstream end below a level pool: what its structures release enters the reach like any inflow. Nothing runs back
 * into the pool. The returned speed also keeps the step within courant A_s/(dQ/dη), beyond which a small pool swings.
 */
export function createReservoirBoundary(
  workspace: Workspace,
  tables: CellTables,
  pool: LevelPool,
  structures: readonly Structure[],
): { boundary: Boundary; release: Release } {
  const below = createWaterSide(workspace, tables, 0, 1);
  const above = {
    isWet: () => true,
    stageAt: () => pool.stage(),
    mostAt: () => Infinity,
    velocityHead: () => 0,
  };
  const release = createRelease(structures, above, below, 0, 1);
  let flow = 0;
  const inflow = createInflowBoundary(workspace, tables, () => flow);

  return {
    release,
    boundary(time) {
      below.look();
      const raised = release.openFlow(time, RISE);
      const growth = (raised - release.openFlow(time, 0)) / RISE;
      flow = release.solve(time);
      if (flow < 0) {
        flow = 0;
        release.flows.fill(0);
      }
      return Math.max(inflow(time), (growth * workspace.dx) / pool.surface());
    },
  };
}
