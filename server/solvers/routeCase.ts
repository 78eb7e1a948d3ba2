import { CASE_DEFAULTS, type CaseFile } from '../../shared/case/caseFile';
import { ARRIVAL_RISE, RESULT_FORMAT, type ResultFile } from '../../shared/case/resultFile';
import { createDownstreamBoundary } from './boundaries/downstreamBoundary';
import { createUpstreamBoundary } from './boundaries/upstreamBoundary';
import { caseHash } from './caseHash';
import { createCellRecorder } from './diagnostics/cellRecorder';
import { createFaceFlow } from './diagnostics/faceFlow';
import { createRunWarnings } from './diagnostics/runWarnings';
import { createSectionRecorder } from './diagnostics/sectionRecorder';
import { createVolumeLedger } from './diagnostics/volumeLedger';
import { createFastKernel } from './fast/fastKernel';
import { runsFast } from './fast/runsFast';
import { createCellState } from './geometry/cellState';
import { createCellTables } from './geometry/cellTables';
import { shapedGrid } from './geometry/grid';
import { createPartedCellState } from './geometry/partedCellState';
import { setInitialState } from './initial/initialState';
import { settleInitial } from './initial/settleInitial';
import { createReferenceKernel } from './kernel';
import { createPolling } from './polling';
import { createRhs } from './rhs';
import type { RouteOptions } from './routeOptions';
import { RunFailed } from './runErrors';
import { createLaterals } from './sources/laterals';
import { createLocalLosses } from './sources/localLosses';
import { createStructureRecorder } from './structures/structureRecorder';
import { createStructureSet } from './structures/structureSet';
import { createLookAhead } from './time/lookAhead';
import { outputTimes, stepTowards } from './time/outputTimes';
import { createSteps } from './time/steps';
import { createTimeStep } from './time/timeStep';
import { SOLVER_VERSION } from './version';
import { createWorkspace } from './workspace';

/** A step below this share of the duration means that the run would never end. */
const SMALLEST_STEP = 1e-10;

/**
 * Routes a case that validateCase accepts. Synchronous, pure, and the same to the bit for the same case, whatever the
 * caller watches. Throws RunFailed where the computation cannot go on, RunCancelled where `shouldStop` says so.
 */
export function routeCase(caseFile: CaseFile, options: RouteOptions = {}): ResultFile {
  const began = performance.now();
  const { numerics } = caseFile;
  const { duration, outputInterval } = numerics;
  const order = numerics.order ?? CASE_DEFAULTS.order;
  const courant = numerics.courant ?? CASE_DEFAULTS.courant;

  const isFast = runsFast(caseFile, options);

  const grid = shapedGrid(caseFile);
  const workspace = createWorkspace(
    grid,
    caseFile.gravity ?? CASE_DEFAULTS.gravity,
    numerics.dryDepth ?? CASE_DEFAULTS.dryDepth,
    isFast,
  );
  const tables = createCellTables(workspace);
  const cellState = workspace.parts
    ? createPartedCellState(workspace, tables, workspace.parts)
    : createCellState(workspace, tables);
  const laterals = createLaterals(caseFile.laterals, grid, workspace.lateralRate);
  const kernel = isFast
    ? createFastKernel(workspace)
    : createReferenceKernel(workspace, tables, cellState, laterals);
  const warnings = createRunWarnings(caseFile, workspace, grid);
  const structures = createStructureSet(caseFile, workspace, tables, grid, warnings.add);
  const localLosses = createLocalLosses(
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
    order,
    structures,
    localLosses,
  );
  const timeStep = createTimeStep(workspace, kernel, tables, laterals, courant, grid.chainage);
  const ledger = createVolumeLedger(workspace);
  const steps = createSteps(workspace, kernel, ledger);
  const faceFlow = createFaceFlow(workspace, order);
  const polling = createPolling(options, duration);

  const mustSettle = setInitialState(
    caseFile,
    workspace,
    tables,
    cellState,
    grid,
    laterals,
    structures,
    localLosses,
    warnings.add,
  );
  if (mustSettle) {
    settleInitial(
      {
        workspace,
        cellState,
        kernel,
        laterals,
        structures,
        rhs,
        timeStep,
        order,
        grid,
        faceFlow,
      },
      polling,
      warnings,
    );
  }

  const sectionRecorder = createSectionRecorder(caseFile, workspace, grid);
  const cellRecorder = createCellRecorder(workspace, grid);
  const structureRecorder = structures ? createStructureRecorder(structures, order) : null;
  const pool = structures?.pool ?? null;
  const lookAhead = createLookAhead(caseFile, workspace, tables, courant, pool);
  const { fluxArea } = workspace;
  const times = outputTimes(duration, outputInterval);
  ledger.open();
  let time = 0;
  let stepCount = 0;
  let next = 0;
  for (;;) {
    if (laterals.any) laterals.setTime(time);
    structures?.follow(time);
    const endSpeed = rhs(time);
    faceFlow.follow();
    structureRecorder?.follow(time);
    sectionRecorder.follow(time);
    cellRecorder.follow(time);
    if (time === times[next]) {
      sectionRecorder.output();
      structureRecorder?.output(time);
      warnings.watch(time);
      options.onOutput?.({ index: next, time, ...cellRecorder.snapshot() });
      next++;
      if (next === times.length) break;
    }
    const largest = timeStep(endSpeed, time);
    if (largest < SMALLEST_STEP * duration) {
      throw new RunFailed(
        'the time step became too small to ever reach the end. Use larger cells, or check the inflow for a ' +
          'mistaken unit',
        time,
        null,
      );
    }
    const dt = stepTowards(time, times[next], lookAhead(time, largest, times[next]));
    const until = dt === times[next] - time ? times[next] : time + dt;

    steps.predict(dt);
    pool?.predict(time, dt, fluxArea[0]);
    if (order === 2) {
      if (laterals.any) laterals.setTime(until);
      rhs(until);
      steps.correct(dt);
      pool?.correct(until, dt, fluxArea[0]);
    } else {
      steps.accept(dt);
      pool?.accept(until, dt, fluxArea[0]);
    }
    faceFlow.keep();
    structureRecorder?.keep();
    time = until;
    stepCount++;
    polling.poll(time, stepCount);
  }
  polling.finish(time, stepCount);

  const reservoir = structureRecorder?.reservoir() ?? null;
  const sectionResults = sectionRecorder.results();
  return {
    format: RESULT_FORMAT,
    caseHash: caseHash(caseFile),
    solver: SOLVER_VERSION,
    times,
    arrivalThreshold: {
      text:
        `The wave has arrived when the stage is ${ARRIVAL_RISE} m above its initial value; ` +
        `where it was dry, when the water is ${ARRIVAL_RISE} m deep.`,
      rise: ARRIVAL_RISE,
      depth: ARRIVAL_RISE,
    },
    sections: sectionResults,
    cells: cellRecorder.results(),
    ...(structureRecorder ? { structures: structureRecorder.structures() } : {}),
    ...(reservoir ? { reservoir } : {}),
    volume: ledger.balance(),
    steps: stepCount,
    cellUpdates: stepCount * grid.cells * order,
    seconds: (performance.now() - began) / 1000,
    warnings: warnings.conclude(sectionResults, steps.missing()),
  };
}
