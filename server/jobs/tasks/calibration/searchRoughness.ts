import {
  compareFlood,
  type ComputedFlood,
  type ObservedFlood,
} from '../../../../shared/calibration/compareFlood';
import { flatnessOf, trialsAlong } from '../../../../shared/calibration/search/flatness';
import { nelderMead } from '../../../../shared/calibration/search/nelderMead';
import type {
  Evaluation,
  Flatness,
  SearchResult,
  SearchStretch,
} from '../../../../shared/calibration/search/types';
import { SaidError } from '../../../../shared/units/SaidError';

export interface Search {
  observed: ObservedFlood;
  /** Clock time of the run's t = 0. */
  startsAt: string | null;
  stretches: SearchStretch[];
  /** Runs before those that tell of flatness. */
  evaluations: number;
}

type Compared = SearchResult['before'];

/** Corners of the simplex this near to one another, as a share of the multiplier, have settled. */
const NEAR = 0.004;
/** The first step is this share of the way between the bounds, by the logarithm. */
const FIRST_STEP = 0.25;

/**
 * Roughness multipliers, one a stretch, that make the misfit least: a bounded simplex in the logarithms of the multipliers,
 * so that a half and a double are as far from 1. `compute` routes the flood with the multipliers it is given; where it
 * throws an Error the set is no good, which `isFailure` tells from what must end the search. `onEvaluation` is told of all
 * runs after each. `known` are those of an attempt that broke off: the search takes the same way again and does not route
 * them a second time. Throws where not even the multipliers of 1 can be routed and compared.
 */
export async function searchRoughness(
  { observed, startsAt, stretches, evaluations: budget }: Search,
  compute: (factors: number[]) => ComputedFlood,
  isFailure: (error: unknown) => boolean,
  onEvaluation: (evaluations: Evaluation[]) => void,
  known: readonly Evaluation[] = [],
): Promise<SearchResult> {
  const evaluations: Evaluation[] = [];
  /** Why the last one gave nothing. */
  let stopped: Error | null = null;
  let best: { factors: number[]; misfit: number; compared: Compared | null } | null = null;

  const comparedWith = async (factors: number[]): Promise<Compared> =>
    compareFlood(observed, compute(factors), startsAt);
  const isKnown = (factors: number[]) => {
    const again = known[evaluations.length];
    // What ended the attempt before is tried anew.
    if (!again || (evaluations.length === 0 && again.misfit === null)) return null;
    return factors.every((factor, i) => factor === again.factors[i]) ? again : null;
  };

  async function evaluate(factors: number[], purpose: Evaluation['purpose']) {
    let misfit: number | null = null;
    let failure: string | null = null;
    stopped = null;
    const again = isKnown(factors);
    if (again) {
      evaluations.push({ ...again, purpose });
      if (again.misfit !== null && (best === null || again.misfit < best.misfit))
        best = { factors, misfit: again.misfit, compared: null };
      return again.misfit;
    }
    try {
      const compared = await comparedWith(factors);
      misfit = compared.misfit;
      if (misfit !== null && (best === null || misfit < best.misfit))
        best = { factors, misfit, compared };
    } catch (error) {
      if (!isFailure(error)) throw error;
      stopped = error as Error;
      failure = stopped.message;
    }
    evaluations.push({ number: evaluations.length + 1, purpose, factors, misfit, failure });
    onEvaluation(evaluations);
    return misfit;
  }
  const bestSoFar = () => best!;
  const whyStopped = () => stopped;

  const ones = stretches.map(() => 1);
  const [first] = [await evaluate(ones, 'before')];
  if (first === null)
    throw (
      whyStopped() ??
      new SaidError(
        'Nothing that was observed can be compared with this run: places off the reach, dry, or times that do not meet.',
      )
    );
  const before = bestSoFar().compared ?? (await comparedWith(ones));

  const low = stretches.map((stretch) => Math.log(stretch.low));
  const high = stretches.map((stretch) => Math.log(stretch.high));
  let isFirst = true;
  const end = await nelderMead(
    async (logs) => {
      // The simplex begins at 1, which is known.
      if (isFirst) {
        isFirst = false;
        return first;
      }
      return (await evaluate(logs.map(Math.exp), 'search')) ?? Infinity;
    },
    ones.map(() => 0),
    {
      low,
      high,
      step: stretches.map((_, i) => FIRST_STEP * (high[i] - low[i])),
      near: NEAR,
      budget,
    },
  );

  const centre = { factors: bestSoFar().factors, misfit: bestSoFar().misfit };
  const flatness: Flatness[] = [];
  for (const [i, stretch] of stretches.entries()) {
    const factor = centre.factors[i];
    const points = [];
    for (const trial of trialsAlong(factor, stretch)) {
      const factors = centre.factors.map((value, k) => (k === i ? trial : value));
      points.push({ factor: trial, misfit: await evaluate(factors, 'flatness') });
    }
    flatness.push(flatnessOf(points, { factor, misfit: centre.misfit }, stretch));
  }
  const { factors, misfit, compared } = bestSoFar();
  const after = compared ?? (await comparedWith(factors));
  return { best: { factors, misfit }, before, after, why: end.why, evaluations, flatness };
}
