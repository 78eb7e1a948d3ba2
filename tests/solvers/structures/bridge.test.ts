import { bridgeRise, PIER_SHAPES, velocityOfRise } from '@/server/solvers/structures/bridgeFlow';
import type { BridgeInput } from '@/shared/case/structures';
import { GRAVITY, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { channel, last } from './structureCases';

/** D. L. Yarnell (1934), USDA Technical Bulletin 442 (from memory); the numbers are computed from it. */
describe('the rise at bridge piers', () => {
  it.each([
    ['semicircular', 0.1, 3, 2, 0.036487],
    ['twinCylindersWithDiaphragm', 0.1, 3, 2, 0.04048],
    ['twinCylinders', 0.1, 3, 2, 0.049087],
    ['triangular', 0.1, 3, 2, 0.049087],
    ['square', 0.1, 3, 2, 0.068783],
    ['square', 0.2, 4, 2.5, 0.258019],
  ] as const)('%s, share %d, depth %d m, %d m/s', (shape, alpha, depth, velocity, rise) => {
    const coefficient = PIER_SHAPES[shape];
    expect(bridgeRise(coefficient, alpha, depth, velocity, GRAVITY)).toBeCloseTo(rise, 6);
    const back = velocityOfRise(coefficient, alpha, depth, rise, GRAVITY);
    expect(back / velocity).toBeCloseTo(1, 4);
  });
});

const bridge: BridgeInput = {
  kind: 'bridge',
  id: 'bridge',
  chainage: 500,
  piers: 'square',
  obstructed: 0.2,
  soffit: 20,
};
const numerics = { cellSize: 20, duration: 3600, outputInterval: 600 };
const steady = (structure: BridgeInput, flow: number, tail: number) =>
  routeChecked(
    channel(
      [structure],
      {
        upstream: { kind: 'inflow', ...steadyFlow(flow) },
        downstream: { kind: 'stage', ...steadyStage(tail) },
        initial: { kind: 'steady' },
        numerics,
      },
      { fall: 0 },
    ),
  ).structures![0];

describe('a bridge in a reach', () => {
  it('raises the water by what its piers do', () => {
    const { stageUp, stageDown, flow, regime } = steady(bridge, 150, 4);
    expect(last(flow)).toBeCloseTo(150, 2);
    expect(last(regime)).toBe('free');
    const depth = last(stageDown);
    const rise = bridgeRise(1.25, 0.2, depth, 150 / (20 * depth), GRAVITY);
    expect(last(stageUp) - last(stageDown)).toBeCloseTo(rise, 3);
  });

  it('presses the water under its deck, and lets it over', () => {
    const low = { ...bridge, soffit: 3 };
    const free = steady(bridge, 120, 4);
    const pressed = steady(low, 120, 4);
    expect(last(pressed.regime)).toBe('drownedGate');
    expect(last(pressed.stageUp)).toBeGreaterThan(last(free.stageUp) + 0.2);
    const over = steady(
      {
        ...low,
        deck: [
          [0, 4.2],
          [20, 4.2],
        ],
      },
      120,
      4,
    );
    expect(last(over.regime)).toBe('overtopped');
    expect(last(over.stageUp)).toBeLessThan(last(pressed.stageUp));
  });

  it('keeps still water still, and works alike in both directions and beside dry ground', () => {
    const still = routeChecked(channel([bridge], { initial: { kind: 'still', stage: 2 } }));
    expect(still.cells.peakVelocity.every((v) => v === 0)).toBe(true);
    const fill = (stageAbove: number | null, stageBelow: number | null) =>
      routeChecked(
        channel(
          [bridge],
          { initial: { kind: 'dam', chainage: 500, stageAbove, stageBelow } },
          { fall: 0 },
        ),
      ).structures![0];
    for (const low of [2, null]) {
      const there = fill(4, low);
      const back = fill(low, 4);
      expect(there.peak.flow).toBeGreaterThan(50);
      there.flow.forEach((q, k) => expect(back.flow[k]).toBeCloseTo(-q, 4));
    }
    expect(fill(null, null).peak.flow).toBe(0);
  });
});
