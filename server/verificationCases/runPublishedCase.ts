import type { ResultFile } from '../../shared/case/resultFile';
import { isWithin } from '../../shared/verificationCases/isWithin';
import {
  MEASURES,
  type CaseCurves,
  type Criterion,
  type GridErrors,
  type Measure,
  type VerificationResult,
} from '../../shared/verificationCases/types';
import { routeCase, SOLVER_VERSION, type RouteOptions } from '../solvers';
import { errorNorms, observedOrder } from './errorNorms';
import type { Problem, PublishedCase, Reading } from './publishedCase';

export interface CaseOptions {
  /** Polled often; true makes it throw RunCancelled. */
  shouldStop?: () => boolean;
  /** 0..1 of all grids. */
  onProgress?: (fraction: number) => void;
}

/** Points of a curve that is kept: more cannot be told apart on a drawing. */
const MOST_POINTS = 800;

/**
 * Routes a case on each of its grids and holds it against its exact solution. Pure but for the seconds; throws what
 * `routeCase` throws.
 */
export function runPublishedCase(
  published: PublishedCase,
  options: CaseOptions = {},
): VerificationResult {
  const { grids, bounds } = published;
  // The work of an explicit scheme grows with the square of the cells.
  const work = grids.map((cells) => cells * cells);
  const whole = work.reduce((sum, w) => sum + w, 0);
  let done = 0;
  const tried = grids.map((cells, k) => {
    const problem = published.problem(cells);
    const routeOptions: RouteOptions = {
      shouldStop: options.shouldStop,
      onProgress: ({ fraction }) => options.onProgress?.((done + fraction * work[k]) / whole),
    };
    const grid = compare(cells, problem, routeCase(problem.caseFile, routeOptions));
    done += work[k];
    options.onProgress?.(done / whole);
    return grid;
  });

  const rows = tried.map(({ errors }, k): GridErrors => {
    if (k === 0) return errors;
    const before = tried[k - 1].errors;
    const { stage, flow } = tried[k].scale;
    const order = (name: 'stage' | 'flow', scale: number) =>
      observedOrder(
        { cells: before.cells, error: before[name].l1 },
        { cells: errors.cells, error: errors[name].l1 },
        scale,
      );
    return { ...errors, stageOrder: order('stage', stage), flowOrder: order('flow', flow) };
  });
  const finest = { ...tried[tried.length - 1], errors: rows[rows.length - 1] };
  const criteria = MEASURES.flatMap((measure): Criterion[] => {
    const bound = bounds[measure];
    if (bound === undefined) return [];
    const value = measured(measure, finest.errors, finest.jumpShift);
    return [{ measure, value, bound, within: isWithin(measure, value, bound) }];
  });
  return {
    caseId: published.id,
    solver: SOLVER_VERSION,
    grids: rows,
    criteria,
    within: criteria.every(({ within }) => within),
    curves: thinned(finest.curves),
    seconds: rows.reduce((sum, { seconds }) => sum + seconds, 0),
  };
}

function compare(cells: number, problem: Problem, result: ResultFile) {
  const { caseFile, exact, jump, from = -Infinity, to = Infinity } = problem;
  const reading = problem.read?.(result) ?? everyCell(result);
  const inside = reading.at.map((at) => at >= from && at <= to);
  const only = (values: readonly number[]) => values.filter((_, i) => inside[i]);
  const at = only(reading.at);
  const truth = at.map(exact);
  const curves: CaseCurves = {
    along: reading.along,
    at,
    bed: reading.bed && only(reading.bed),
    stage: { computed: only(reading.stage), exact: truth.map(({ stage }) => stage) },
    flow: { computed: only(reading.flow), exact: truth.map(({ flow }) => flow) },
    leftOut: jump ? [[jump.at - jump.disturbed, jump.at + jump.disturbed]] : [],
  };
  const counts = (i: number) => !jump || Math.abs(at[i] - jump.at) > jump.disturbed;
  const { sections } = caseFile;
  const cellSize = (sections[sections.length - 1].chainage - sections[0].chainage) / cells;
  const errors: GridErrors = {
    cells,
    cellSize,
    stage: errorNorms(curves.stage.computed, curves.stage.exact, counts),
    flow: errorNorms(curves.flow.computed, curves.flow.exact, counts),
    stageOrder: null,
    flowOrder: null,
    volumeError: Math.abs(result.volume.relativeError),
    steps: result.steps,
    seconds: result.seconds,
  };
  const largest = (values: readonly number[]) =>
    values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
  return {
    errors,
    curves,
    scale: { stage: largest(curves.stage.exact), flow: largest(curves.flow.exact) },
    jumpShift: jump ? shiftOf(curves, jump.height) : null,
  };
}

/** How far a jump is out of place, in cells: the volume between both surfaces over the height of the jump. */
function shiftOf({ stage }: CaseCurves, height: number): number {
  return stage.computed.reduce((sum, z, i) => sum + Math.abs(z - stage.exact[i]), 0) / height;
}

function everyCell({ cells }: ResultFile): Reading {
  return {
    along: 'chainage',
    at: cells.chainage,
    bed: cells.bed,
    stage: cells.finalStage,
    flow: cells.finalFlow,
  };
}

function measured(
  measure: Measure,
  { stage, flow, stageOrder, flowOrder, volumeError }: GridErrors,
  jumpShift: number | null,
): number | null {
  const values: Record<Measure, number | null> = {
    stageL1: stage.l1,
    stageMax: stage.max,
    flowL1: flow.l1,
    flowMax: flow.max,
    stageOrder,
    flowOrder,
    jumpShift,
    volume: volumeError,
  };
  return values[measure];
}

/** Every second, third … point, so that no more than MOST_POINTS are left. */
function thinned(curves: CaseCurves): CaseCurves {
  const step = Math.ceil(curves.at.length / MOST_POINTS);
  if (step === 1) return curves;
  const some = (values: readonly number[]) => values.filter((_, i) => i % step === 0);
  const both = ({ computed, exact }: CaseCurves['stage']) => ({
    computed: some(computed),
    exact: some(exact),
  });
  return {
    ...curves,
    at: some(curves.at),
    bed: curves.bed && some(curves.bed),
    stage: both(curves.stage),
    flow: both(curves.flow),
  };
}
