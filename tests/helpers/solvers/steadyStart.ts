import { createDownstreamBoundary } from '@/server/solvers/boundaries/downstreamBoundary';
import { createUpstreamBoundary } from '@/server/solvers/boundaries/upstreamBoundary';
import { createFaceFlow } from '@/server/solvers/diagnostics/faceFlow';
import { createVolumeLedger } from '@/server/solvers/diagnostics/volumeLedger';
import { createCellState } from '@/server/solvers/geometry/cellState';
import { createCellTables } from '@/server/solvers/geometry/cellTables';
import { shapedGrid } from '@/server/solvers/geometry/grid';
import { setInitialState } from '@/server/solvers/initial/initialState';
import { settle } from '@/server/solvers/initial/settle';
import { createSteadyNewton } from '@/server/solvers/initial/steadyNewton';
import { createSteadyResidual } from '@/server/solvers/initial/steadyResidual';
import { createReferenceKernel } from '@/server/solvers/kernel';
import { createRhs } from '@/server/solvers/rhs';
import { createLaterals } from '@/server/solvers/sources/laterals';
import { createLocalLosses } from '@/server/solvers/sources/localLosses';
import { createStructureSet } from '@/server/solvers/structures/structureSet';
import { createSteps } from '@/server/solvers/time/steps';
import { createTimeStep } from '@/server/solvers/time/timeStep';
import { createWorkspace } from '@/server/solvers/workspace';
import type { CaseFile } from '@/shared/case/caseFile';
import { GRAVITY } from './caseBuilders';

/** The steady start of a plain case of second order, as it settles by Newton's method and steps or by steps alone. */
export function steadyStart(caseFile: CaseFile, by: 'newton' | 'steps') {
  const grid = shapedGrid(caseFile);
  const workspace = createWorkspace(grid, GRAVITY, 0.001);
  const tables = createCellTables(workspace);
  const cellState = createCellState(workspace, tables);
  const laterals = createLaterals(caseFile.laterals, grid, workspace.lateralRate);
  const kernel = createReferenceKernel(workspace, tables, cellState, laterals);
  const warn = () => undefined;
  const structures = createStructureSet(caseFile, workspace, tables, grid, warn);
  const losses = createLocalLosses(
    caseFile.localLosses ?? [],
    workspace,
    tables,
    grid,
    (face) => structures?.holds(face) ?? false,
  );
  const rhs = createRhs(
    kernel,
    structures?.boundary ?? createUpstreamBoundary(workspace, tables, caseFile.upstream),
    createDownstreamBoundary(workspace, tables, caseFile.downstream),
    2,
    structures,
    losses,
  );
  setInitialState(caseFile, workspace, tables, cellState, grid, laterals, structures, losses, warn);
  const newton = createSteadyNewton(
    workspace,
    cellState,
    createSteadyResidual(workspace, cellState, rhs, laterals, 2, structures !== null),
  );
  const settled = settle(
    workspace,
    rhs,
    createSteps(workspace, kernel, createVolumeLedger(workspace)),
    createTimeStep(workspace, kernel, tables, laterals, 0.8, grid.chainage),
    laterals,
    2,
    grid.start,
    createFaceFlow(workspace, 2),
    by === 'newton' ? newton : () => false,
    () => undefined,
  );
  return { ...settled, stage: workspace.stage.slice(1, -1), flow: workspace.faceFlow.slice() };
}
