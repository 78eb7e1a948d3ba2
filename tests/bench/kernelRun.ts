import { createWallBoundary } from '../../server/solvers/boundaries/wallBoundary';
import { downstreamEnd, upstreamEnd } from '../../server/solvers/boundaries/endState';
import { createVolumeLedger } from '../../server/solvers/diagnostics/volumeLedger';
import { createCellState } from '../../server/solvers/geometry/cellState';
import { createCellTables } from '../../server/solvers/geometry/cellTables';
import { shapedGrid } from '../../server/solvers/geometry/grid';
import { createFastKernel } from '../../server/solvers/fast/fastKernel';
import { createReferenceKernel } from '../../server/solvers/kernel';
import { createRhs } from '../../server/solvers/rhs';
import { createLaterals } from '../../server/solvers/sources/laterals';
import { createSteps } from '../../server/solvers/time/steps';
import { createTimeStep } from '../../server/solvers/time/timeStep';
import { createWorkspace, type Workspace } from '../../server/solvers/workspace';
import { naturalReach } from './naturalReach';

/** One of the solver's kernels alone, on a river of `cells` cells with walls at its ends. */
export interface KernelRun {
  workspace: Workspace;
  /** Seconds for so many steps of at most `dt` s */
  seconds(dt: number, steps: number): number;
}

export function createKernelRun(cells: number, which: 'fast' | 'reference'): KernelRun {
  const length = 20_000;
  const grid = shapedGrid(naturalReach(length, length / cells));
  const workspace = createWorkspace(grid, 9.81, 0.001, which === 'fast');
  const { n, bed, flow } = workspace;
  const tables = createCellTables(workspace);
  const state = createCellState(workspace, tables);
  const laterals = createLaterals([], grid, workspace.lateralRate);
  const kernel =
    which === 'fast'
      ? createFastKernel(workspace)
      : createReferenceKernel(workspace, tables, state, laterals);
  const steps = createSteps(workspace, kernel, createVolumeLedger(workspace));
  const timeStep = createTimeStep(workspace, kernel, tables, laterals, 0.8, grid.chainage);
  const upstream = createWallBoundary(workspace, tables, upstreamEnd());
  const downstream = createWallBoundary(workspace, tables, downstreamEnd(n));
  const rhs = createRhs(kernel, upstream, downstream, 2);
  for (let i = 1; i <= n; i++) {
    // A smooth surface that follows the fall of the reach, a little within a level of every table.
    state.placeAtStage(i, 103.5 + (n - i) * grid.dx * 0.001 + 0.05 * Math.sin(i / 30));
    flow[i] = bed[i] > 0 ? 150 + 20 * Math.sin(i / 50) : 0;
  }
  return {
    workspace,
    seconds(dt, count) {
      const began = performance.now();
      for (let k = 0; k < count; k++) {
        const step = Math.min(dt, timeStep(rhs(0), 0));
        steps.predict(step);
        rhs(0);
        steps.correct(step);
      }
      return (performance.now() - began) / 1000;
    },
  };
}
