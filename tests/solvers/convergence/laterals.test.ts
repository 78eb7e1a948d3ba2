import { surfaceProfile } from '@/server/solvers/exact/graduallyVariedFlow';
import { prismaticReach } from '@/server/solvers/exact/prismaticReach';
import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import { normalDepth } from '@/server/solvers/exact/uniformFlow';
import type { Lateral } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  GRAVITY,
  steadyFlow,
  steadyStage,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

const section = trapezoid(10, 1);
const [MANNING, SLOPE, LENGTH, INFLOW] = [0.03, 0.001, 1000, 20];
/** m³/s, of some 20. Where the flow bends, a slope limiter switches between the two stages of a step for ever: their
 *  mean is even, the first, which is shown, is off by 2e-5. */
const FLOW_ROUNDING = 5e-4;
/** Long enough for the flow to rest. */
const DURATION = 7200;

function settle(lateral: Omit<Lateral, 'times' | 'flows'>, flow: number, outletDepth: number) {
  return routeChecked(
    buildCase({
      sections: buildSections(0, LENGTH, 2, MANNING, (x) =>
        trapezoidPoints(10, 1, SLOPE * (LENGTH - x), 8),
      ),
      upstream: { kind: 'inflow', ...steadyFlow(INFLOW) },
      downstream: { kind: 'stage', ...steadyStage(outletDepth) },
      laterals: [{ ...lateral, ...steadyFlow(flow) }],
      initial: { kind: 'steady' },
      numerics: { cellSize: 5, duration: DURATION, outputInterval: DURATION },
    }),
  );
}

describe('lateral flow', () => {
  it.each([
    ['gained', 12],
    ['lost', -8],
  ])('%s over a stretch: flow and surface of spatially varied flow', (_name, gain) => {
    // The equations of Chow (1959), sec. 12-1 and 12-2, integrated piece by piece.
    const [from, to] = [400, 600];
    const share = (x: number) => Math.min(1, Math.max(0, (x - from) / (to - from)));
    const outletDepth = normalDepth(section, MANNING, SLOPE, INFLOW + gain);
    const { cells, volume } = settle({ from, to }, gain, outletDepth);
    const inside = (x: number) => x > from && x < to;
    const reachOn = (low: number) =>
      prismaticReach(
        section,
        MANNING,
        SLOPE,
        (x) => INFLOW + gain * share(x + LENGTH),
        () => (inside(low + 1) ? gain / (to - from) : 0),
      );
    // The reach's bed is at zero at its lower end: x runs from -LENGTH to 0.
    let stage = outletDepth;
    for (const [low, high] of [
      [to, LENGTH],
      [from, to],
      [0, from],
    ]) {
      const places = cells.chainage.filter((x) => x > low && x < high).reverse();
      const stops = [high, ...places, low].map((x) => x - LENGTH);
      const exact = surfaceProfile(reachOn(low), GRAVITY, stops, stage);
      places.forEach((x, k) => {
        const i = cells.chainage.indexOf(x);
        // The lateral flow lifts or lowers the surface by some 0.2 m; the kink of the flow costs first order at its ends.
        expect(Math.abs(cells.finalStage[i] - exact[k + 1])).toBeLessThan(2e-3);
        expect(Math.abs(cells.finalFlow[i] - INFLOW - gain * share(x))).toBeLessThan(FLOW_ROUNDING);
      });
      stage = exact[exact.length - 1];
    }
    expect(volume.lateral).toBeCloseTo(DURATION * gain, 6);
  });

  it('at a point steps the flow by its own amount', () => {
    const outletDepth = normalDepth(section, MANNING, SLOPE, 25);
    const { cells } = settle({ from: 502.5, to: 502.5 }, 5, outletDepth);
    cells.chainage.forEach((x, i) => {
      if (Math.abs(x - 502.5) < 1) return;
      expect(Math.abs(cells.finalFlow[i] - (x < 502.5 ? 20 : 25))).toBeLessThan(FLOW_ROUNDING);
    });
  });

  it('never takes more than there is, and says so', () => {
    const { cells, volume, warnings, sections } = settle({ from: 500, to: 500 }, -50, 0.5);
    expect(warnings.map(({ code }) => code)).toContain('lateralLimited');
    expect(Math.min(...cells.finalDepth)).toBeGreaterThanOrEqual(0);
    // The whole inflow is taken: not 50 m³/s, and what the outlet's stage sends back cannot pass the bed's rise.
    expect(-volume.lateral).toBeGreaterThan(DURATION * 19.9);
    expect(-volume.lateral).toBeLessThan(DURATION * 20 + volume.initial + 1);
    expect(sections[1].flow.at(-1)!).toBeLessThanOrEqual(0.1);
  });
});
