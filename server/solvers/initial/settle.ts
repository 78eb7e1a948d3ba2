import type { FaceFlow } from '../diagnostics/faceFlow';
import type { Rhs } from '../rhs';
import type { Laterals } from '../sources/laterals';
import type { Steps } from '../time/steps';
import type { Workspace } from '../workspace';
import type { SteadyNewton } from './steadyNewton';
import { stillFlow } from './stillFlow';

/** Flows that agree with the steady balance to this share count as steady. */
const STEADY = 1e-8;
/** More cell updates than this are not spent on it … */
const BUDGET = 3e7;
/** … but so many steps are always. */
const LEAST_STEPS = 2000;
const CHECK_EVERY = 50;
/** Steps before which it is tried to get there at once: what marches moves jumps and fronts to where that can succeed. */
const ATTEMPTS = [0, 300, 1000, 3000];

export interface Settled {
  /** Largest difference of the flow from the steady balance, as a share of the largest flow */
  residual: number;
  /** Where (m) */
  chainage: number;
  steps: number;
}

/**
 * Lets the state settle with everything frozen at time 0: by Newton's method (steadyNewton.ts), and by steps that show whether it
 * stays and get on where that stalls, until the flow is that of the steady balance, it stops getting nearer, or the
 * effort is spent.
 */
export function settle(
  workspace: Workspace,
  rhs: Rhs,
  steps: Steps,
  timeStep: (endSpeed: number, time: number) => number,
  laterals: Laterals,
  order: 1 | 2,
  start: number,
  faceFlow: FaceFlow,
  newton: SteadyNewton,
  poll: () => void,
): Settled {
  const { n, dx, faceFlow: flow, stage, bed, dryDepth } = workspace;
  const depth = (i: number): number => stage[i] - bed[i];
  const most = Math.max(LEAST_STEPS, Math.min(200_000, Math.floor(BUDGET / n)));
  const patience = 2000 + 4 * n;
  laterals.setTime(0);
  let best = Infinity;
  let bestStep = 0;
  let settled: Settled = { residual: Infinity, chainage: start, steps: 0 };

  let attempt = 0;
  for (let step = 0; ; step++) {
    if (step === ATTEMPTS[attempt]) {
      attempt++;
      newton(poll);
    }
    const endSpeed = rhs(0);
    if (step % CHECK_EVERY === 0) {
      poll();
      faceFlow.follow();
      settled = { ...imbalance(), steps: step };
      if (settled.residual < 0.5 * best) {
        best = settled.residual;
        bestStep = step;
      }
      // The state that comes in has the steady flow by construction: only steps tell whether it stays.
      const isSteady = step > 0 && settled.residual <= STEADY;
      if (isSteady || step >= most || step - bestStep > patience) return settled;
    }
    const dt = timeStep(endSpeed, 0);
    if (!(dt < Infinity)) return settled;
    steps.predict(dt);
    if (order === 2) {
      rhs(0);
      steps.correct(dt);
    } else steps.accept(dt);
    faceFlow.keep();
  }

  function imbalance(): { residual: number; chainage: number } {
    let expected = flow[0];
    let scale = stillFlow(workspace);
    let worst = 0;
    let place = 0;
    for (let i = 1; i <= n; i++) {
      expected += laterals.rate[i];
      // A withdrawal takes no more than what comes: it leaves a dry bed and nothing that flows on.
      if (laterals.rate[i] < 0 && expected < flow[i] && depth(i) <= dryDepth) expected = flow[i];
      scale = Math.max(scale, Math.abs(flow[i - 1]), Math.abs(flow[i]));
      const off = Math.abs(flow[i] - expected);
      if (off > worst) {
        worst = off;
        place = i;
      }
    }
    return { residual: scale > 0 ? worst / scale : 0, chainage: start + place * dx };
  }
}
