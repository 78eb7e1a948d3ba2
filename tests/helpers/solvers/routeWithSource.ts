import { createDownstreamBoundary } from '@/server/solvers/boundaries/downstreamBoundary';
import { createUpstreamBoundary } from '@/server/solvers/boundaries/upstreamBoundary';
import { createVolumeLedger } from '@/server/solvers/diagnostics/volumeLedger';
import { createCellState } from '@/server/solvers/geometry/cellState';
import { createCellTables } from '@/server/solvers/geometry/cellTables';
import { shapedGrid } from '@/server/solvers/geometry/grid';
import { createReferenceKernel } from '@/server/solvers/kernel';
import { createRhs } from '@/server/solvers/rhs';
import type { Laterals } from '@/server/solvers/sources/laterals';
import { stepTowards } from '@/server/solvers/time/outputTimes';
import { createSteps } from '@/server/solvers/time/steps';
import { createTimeStep } from '@/server/solvers/time/timeStep';
import { createWorkspace } from '@/server/solvers/workspace';
import type { CaseFile } from '@/shared/case/caseFile';

/** What is added to both equations at the middle of cell i (0 based), which no case file can say. */
export interface Source {
  /** Of volume, m²/s: goes through the solver's own lateral inflow. */
  lateral(cell: number, time: number): number;
  /** Of momentum, m³/s². */
  momentum(cell: number, time: number): number;
}

/** State at the middles of the cells: stage (m), area (m²), flow (m³/s). */
export interface CellStates {
  chainage: number[];
  stage: number[];
  area: number[];
  flow: number[];
}

/** Routes a case with a source from the given state by the parts of the solver, in the order of routeCase. */
export function routeWithSource(
  caseFile: CaseFile,
  source: Source,
  initial: (chainage: number) => { stage: number; flow: number },
): CellStates {
  const { duration, order = 2, courant = 0.8 } = caseFile.numerics;
  const grid = shapedGrid(caseFile);
  const workspace = createWorkspace(grid, caseFile.gravity!, 0.001);
  const { n, dx, area, flow, stage, fluxRight, lateralRate } = workspace;
  const tables = createCellTables(workspace);
  const state = createCellState(workspace, tables);
  const laterals: Laterals = {
    any: true,
    rate: lateralRate,
    largest: new Float64Array(n + 2),
    setTime: (time) => {
      for (let i = 1; i <= n; i++) lateralRate[i] = dx * source.lateral(i - 1, time);
    },
    totalAbove: () => 0,
  };
  const kernel = createReferenceKernel(workspace, tables, state, laterals);
  const fluxes = createRhs(
    kernel,
    createUpstreamBoundary(workspace, tables, caseFile.upstream),
    createDownstreamBoundary(workspace, tables, caseFile.downstream),
    order,
  );
  const rhs = (time: number) => {
    laterals.setTime(time);
    const endSpeed = fluxes(time);
    for (let i = 1; i <= n; i++) fluxRight[i - 1] += dx * source.momentum(i - 1, time);
    return endSpeed;
  };
  const timeStep = createTimeStep(workspace, kernel, tables, laterals, courant, grid.chainage);
  const steps = createSteps(workspace, kernel, createVolumeLedger(workspace));

  grid.chainage.forEach((x, i) => {
    const start = initial(x);
    state.placeAtStage(i + 1, start.stage);
    flow[i + 1] = start.flow;
  });
  for (let time = 0; time < duration;) {
    const dt = stepTowards(time, duration, timeStep(rhs(time), time));
    time = dt === duration - time ? duration : time + dt;
    steps.predict(dt);
    if (order === 2) {
      rhs(time);
      steps.correct(dt);
    } else steps.accept(dt);
  }
  const cells = (values: Float64Array) => [...values.subarray(1, n + 1)];
  return {
    chainage: [...grid.chainage],
    stage: cells(stage),
    area: cells(area),
    flow: cells(flow),
  };
}
