import { q, say } from '../../../shared/units/message';
import type { FaceFlow } from '../diagnostics/faceFlow';
import { createVolumeLedger } from '../diagnostics/volumeLedger';
import type { RunWarnings } from '../diagnostics/runWarnings';
import type { CellState } from '../geometry/cellState';
import type { Grid } from '../geometry/grid';
import type { Kernel } from '../kernel';
import type { Polling } from '../polling';
import type { Rhs } from '../rhs';
import type { Laterals } from '../sources/laterals';
import type { StructureSet } from '../structures/structureSet';
import { createSteps } from '../time/steps';
import type { Workspace } from '../workspace';
import { settle } from './settle';
import { createSteadyNewton } from './steadyNewton';
import { createSteadyResidual } from './steadyResidual';

/** A flow that is off by more than this share of the inflow is worth a warning. */
const WORTH_WARNING = 1e-3;

export interface SettleParts {
  workspace: Workspace;
  cellState: CellState;
  kernel: Kernel;
  laterals: Laterals;
  structures: StructureSet | null;
  rhs: Rhs;
  timeStep: (endSpeed: number, time: number) => number;
  order: 1 | 2;
  grid: Grid;
  faceFlow: FaceFlow;
}

/** Lets the initial steady state settle, on books of its own, and warns where it did not. */
export function settleInitial(parts: SettleParts, polling: Polling, warnings: RunWarnings): void {
  const {
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
  } = parts;
  const steps = createSteps(workspace, kernel, createVolumeLedger(workspace));
  const steadyResidual = createSteadyResidual(
    workspace,
    cellState,
    rhs,
    laterals,
    order,
    structures !== null,
  );
  const { residual, chainage } = settle(
    workspace,
    rhs,
    steps,
    timeStep,
    laterals,
    order,
    grid.start,
    faceFlow,
    createSteadyNewton(workspace, cellState, steadyResidual),
    polling.pollStart,
  );
  if (residual <= WORTH_WARNING) return;
  warnings.add({
    code: 'initialNotSettled',
    ...say`The initial steady state did not settle: at chainage ${q(chainage, 'chainage')} the flow is still ${(100 * residual).toPrecision(2)} % off. Begin the inflow with some hours of steady flow, or give the initial state as a profile.`,
    chainage,
    time: 0,
  });
}
