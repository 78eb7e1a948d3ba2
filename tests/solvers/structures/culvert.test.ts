import { boxBarrel, circularBarrel, criticalDepthIn } from '@/server/solvers/structures/barrel';
import {
  freeSurfaceHeadwater,
  fullLosses,
  inletHeadwater,
  outletHeadwater,
} from '@/server/solvers/structures/culvertFlow';
import { CULVERT_INLETS } from '@/server/solvers/structures/culvertInlets';
import type { CulvertInlet, CulvertInput } from '@/shared/case/structures';
import { GRAVITY, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { channel, last } from './structureCases';

const pipe = circularBarrel(1.5);
const small = circularBarrel(0.9);
const box = boxBarrel(2, 1.5);

/** Forms of FHWA HDS-5 (Schall et al. 2012, FHWA-HIF-12-026, appendix A); the numbers are computed from them. */
describe('a barrel by HDS-5', () => {
  const cases: [string, typeof pipe, CulvertInlet, number, number, number, number | null][] = [
    ['pipe 1.5 m', pipe, 'concretePipeSquareEdge', 2, 0.01, 0.72675, 1.04346],
    ['pipe 1.5 m', pipe, 'concretePipeSquareEdge', 4, 0.01, 1.04248, 1.67421],
    ['pipe 1.5 m', pipe, 'concretePipeSquareEdge', 6, 0.01, 1.26376, 2.5023],
    ['pipe 0.9 m', small, 'metalPipeProjecting', 1.4, 0.005, 0.69986, 1.3621],
    ['box 2 x 1.5 m', box, 'boxWingwalls30to75', 5, 0.005, 0.86047, 1.38307],
    ['box 2 x 1.5 m', box, 'boxWingwalls30to75', 8, 0.005, 1.17711, null],
  ];
  it.each(cases)('%s: inlet control', (_, barrel, inlet, flow, slope, critical, headwater) => {
    expect(criticalDepthIn(barrel, flow, GRAVITY)).toBeCloseTo(critical, 4);
    const found = inletHeadwater(barrel, CULVERT_INLETS[inlet], slope, flow, GRAVITY);
    if (headwater !== null) expect(found).toBeCloseTo(headwater, 4);
  });

  it('has losses of full flow and headwater under outlet control', () => {
    // 1 + K_e + 2 g n² L/R^(4/3) by hand: R = 1.5/4 m, n = 0.012, L = 50 m.
    const losses = fullLosses(pipe, CULVERT_INLETS.concretePipeSquareEdge, 0.012, 50, GRAVITY);
    const expected = 1.5 + (2 * 9.81 * 0.012 ** 2 * 50) / 0.375 ** (4 / 3);
    expect(losses).toBeCloseTo(expected, 10);
    // H = k V²/(2g), h_o = (y_c + D)/2 with y_c = 1.26376 m; 6 m³/s over 0.5 m of fall.
    const head = (expected * (6 / (Math.PI * 0.5625)) ** 2) / (2 * 9.81);
    const free = outletHeadwater(pipe, losses, 0.5, 6, 1, GRAVITY);
    expect(free).toBeCloseTo(head + 0.5 * (1.26376 + 1.5) - 0.5, 4);
    expect(outletHeadwater(pipe, losses, 0.5, 6, 1.8, GRAVITY)).toBeCloseTo(head + 1.8 - 0.5, 10);
  });

  it('joins the two inlet curves without a step or a kink, rising', () => {
    const inlet = CULVERT_INLETS.boxWingwalls30to75;
    const perX = (3 * Math.sqrt(1.5)) / 1.811;
    const headAt = (x: number) => inletHeadwater(box, inlet, 0.005, x * perX, GRAVITY);
    for (const x of [3.5, 4]) {
      expect(headAt(x + 1e-7) - headAt(x - 1e-7)).toBeLessThan(1e-5);
      const before = (headAt(x) - headAt(x - 1e-4)) / 1e-4;
      const after = (headAt(x + 1e-4) - headAt(x)) / 1e-4;
      expect(after / before).toBeCloseTo(1, 2);
    }
    for (let x = 3.4; x < 4.2; x += 0.01) expect(headAt(x + 0.01)).toBeGreaterThan(headAt(x));
    // Between 1.2771 m of the unsubmerged curve and 1.3470 m of the submerged one, each times D, at X = 3.943.
    const joined = headAt(8 / perX);
    expect(joined).toBeGreaterThan(1.2771 * 1.5);
    expect(joined).toBeLessThan(1.347 * 1.5 + 1e-3);
  });

  it('with a free surface ends in the energy of its entrance: a flat frictionless barrel keeps critical energy', () => {
    const head = freeSurfaceHeadwater(box, 0, 1e-6, 10, 0, 3, GRAVITY);
    const critical = Math.cbrt(1.5 ** 2 / GRAVITY);
    expect(head).toBeCloseTo(1.5 * critical, 3);
    expect(freeSurfaceHeadwater(box, 0.5, 0.03, 40, 0, 3, GRAVITY)).toBeGreaterThan(head);
    expect(freeSurfaceHeadwater(box, 0.5, 0.012, 40, 2, 3, GRAVITY)).toBe(0);
  });
});

const culvert: CulvertInput = {
  kind: 'culvert',
  id: 'culvert',
  chainage: 500,
  shape: 'circular',
  diameter: 1.5,
  barrels: 2,
  n: 0.012,
  length: 30,
  invertUp: 0.5,
  invertDown: 0.5,
  inlet: 'concretePipeSquareEdge',
};
const numerics = { cellSize: 20, duration: 3600, outputInterval: 600 };
const flat = { fall: 0 };

describe('a culvert in a reach', () => {
  it.each([
    ['drownedPipe', 2.6],
    ['outletControl', 1.2],
  ])('%s: holds the headwater of the formula', (regime, tail) => {
    const result = routeChecked(
      channel(
        [culvert],
        {
          upstream: { kind: 'inflow', ...steadyFlow(8) },
          downstream: { kind: 'stage', ...steadyStage(tail) },
          initial: { kind: 'steady' },
          numerics,
        },
        flat,
      ),
    );
    const { stageUp, stageDown, flow, regime: regimes } = result.structures![0];
    expect(last(regimes)).toBe(regime);
    expect(last(flow)).toBeCloseTo(8, 3);
    const losses = fullLosses(pipe, CULVERT_INLETS.concretePipeSquareEdge, 0.012, 30, GRAVITY);
    const needed = outletHeadwater(pipe, losses, 0, 4, last(stageDown) - 0.5, GRAVITY);
    expect(last(stageUp) - 0.5).toBeCloseTo(needed, 3);
  });

  it('is overtopped where it cannot pass the flow', () => {
    const road: CulvertInput = {
      ...culvert,
      crest: [
        [0, 3],
        [20, 3],
      ],
    };
    const result = routeChecked(
      channel(
        [road],
        {
          upstream: { kind: 'inflow', ...steadyFlow(40) },
          downstream: { kind: 'stage', ...steadyStage(2) },
          initial: { kind: 'steady' },
          numerics,
        },
        flat,
      ),
    );
    const { stageUp, regime } = result.structures![0];
    expect(last(regime)).toBe('overtopped');
    expect(last(stageUp)).toBeGreaterThan(3.5);
    expect(last(stageUp)).toBeLessThan(4.1);
  });

  it('keeps still water still, works alike in both directions and beside dry ground', () => {
    const still = routeChecked(channel([culvert], { initial: { kind: 'still', stage: 1.2 } }));
    expect(still.cells.peakVelocity.every((v) => v === 0)).toBe(true);
    const fill = (stageAbove: number | null, stageBelow: number | null) =>
      routeChecked(
        channel(
          [culvert],
          { initial: { kind: 'dam', chainage: 500, stageAbove, stageBelow } },
          flat,
        ),
      );
    for (const low of [1, null]) {
      const there = fill(4, low).structures![0];
      const back = fill(low, 4).structures![0];
      expect(there.peak.flow).toBeGreaterThan(8);
      there.flow.forEach((q, k) => expect(back.flow[k]).toBeCloseTo(-q, 6));
    }
  });
});
