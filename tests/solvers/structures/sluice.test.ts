import { gateFlow, type GateFlow } from '@/server/solvers/structures/sluiceFlow';
import type { SluiceInput } from '@/shared/case/structures';
import { GRAVITY, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { channel, last } from './structureCases';

const flowUnder = (up: number, down: number, opening: number): GateFlow => {
  const out = { q: 0, isDrowned: false };
  gateFlow(out, up, down, opening, 0.611, GRAVITY);
  return out;
};

/** Energy and momentum at a gate with C_c = 0.611: Henderson (1966), Open Channel Flow, section 6.6; Henry (1950)
 *  (from memory); the numbers are computed from them. */
describe('flow under a gate', () => {
  it.each([
    [2, 0.3, 1.098969, 1.070971],
    [3, 0.5, 2.23287, 1.677691],
    [5, 1.0, 5.712689, 3.008509],
  ])('free: y1 %d m, opening %d m', (up, opening, q, sequent) => {
    expect(flowUnder(up, 0, opening).q).toBeCloseTo(q, 6);
    expect(flowUnder(up, 0.98 * sequent, opening)).toEqual(flowUnder(up, 0, opening));
    expect(flowUnder(up, sequent - 1e-5, opening).isDrowned).toBe(false);
    expect(flowUnder(up, sequent + 1e-5, opening).isDrowned).toBe(true);
  });

  it.each([
    [1, 0.1],
    [1, 0.5],
    [1, 0.9],
    [3, 0.5],
    [5, 1],
  ])('drowns without a jump: y1 %d m, opening %d m', (up, opening) => {
    const free = flowUnder(up, 0, opening).q;
    const largestFall = (step: number): number => {
      let most = 0;
      for (let down = 0.3 * up; down + step < 0.98 * up; down += step) {
        const fall = flowUnder(up, down, opening).q - flowUnder(up, down + step, opening).q;
        most = Math.max(most, fall / free);
      }
      return most;
    };
    // The relations apart fall by 4 to 29 % of the free flow at one depth; the same over 1.5 % of the sequent depth is this.
    const perMillimetre = largestFall(1e-3);
    expect(perMillimetre).toBeLessThan(0.03);
    expect(largestFall(1e-5)).toBeLessThan(0.02 * perMillimetre);
  });

  it.each([
    [3, 0.5, 2.4, 1.203405],
    [3, 0.5, 2.7, 0.836003],
    [5, 1.0, 4.0, 3.204485],
  ])('drowned: y1 %d m, opening %d m, tailwater %d m', (up, opening, down, q) => {
    expect(flowUnder(up, down, opening).q).toBeCloseTo(q, 6);
  });

  it('falls with the tailwater to nothing where both stand level', () => {
    let before = Infinity;
    for (let down = 0; down <= 3; down += 0.01) {
      const { q } = flowUnder(3, Math.min(3, down), 0.5);
      expect(q).toBeLessThanOrEqual(before + 1e-12);
      before = q;
    }
    expect(flowUnder(3, 3, 0.5).q).toBe(0);
  });
});

const sluice: SluiceInput = {
  kind: 'sluice',
  id: 'gate',
  chainage: 500,
  width: 10,
  sill: 0,
  times: [0],
  openings: [0.5],
};
const numerics = { cellSize: 20, duration: 3600, outputInterval: 600 };
const flat = { fall: 0 };

describe('a sluice in a reach', () => {
  it('holds the stage that the formula needs, drowned', () => {
    const result = routeChecked(
      channel(
        [sluice],
        {
          upstream: { kind: 'inflow', ...steadyFlow(15) },
          downstream: { kind: 'stage', ...steadyStage(2.4) },
          initial: { kind: 'steady' },
          numerics,
        },
        flat,
      ),
    );
    const { stageUp, stageDown, flow, regime } = result.structures![0];
    expect(last(regime)).toBe('drownedGate');
    expect(last(flow)).toBeCloseTo(15, 3);
    expect(10 * flowUnder(last(stageUp), last(stageDown), 0.5).q).toBeCloseTo(15, 3);
  });

  it('holds the stage that the formula needs, free above a fall', () => {
    const result = routeChecked(
      channel([{ ...sluice, sill: 2 }], {
        upstream: { kind: 'inflow', ...steadyFlow(15) },
        downstream: { kind: 'stage', ...steadyStage(1.5) },
        initial: { kind: 'steady' },
        numerics,
      }),
    );
    const { stageUp, regime } = result.structures![0];
    expect(last(regime)).toBe('gate');
    expect(10 * flowUnder(last(stageUp) - 2, 0, 0.5).q).toBeCloseTo(15, 3);
  });

  it('opens and closes in time, and shut holds the water', () => {
    const moved = { ...sluice, times: [0, 600, 1200, 1500, 1800], openings: [0, 0, 1, 0, 0] };
    const result = routeChecked(
      channel(
        [moved],
        {
          initial: { kind: 'dam', chainage: 500, stageAbove: 4, stageBelow: 1 },
          numerics: { ...numerics, outputInterval: 300 },
        },
        flat,
      ),
    );
    const { flow, regime } = result.structures![0];
    expect(flow.slice(0, 3)).toEqual([0, 0, 0]);
    expect(flow[4]).toBeGreaterThan(20);
    expect(regime[2]).toBe('closed');
    for (let k = 6; k < flow.length; k++) expect(flow[k]).toBe(0);
  });

  it('works alike in both directions, and from either dry side', () => {
    const fill = (stageAbove: number | null, stageBelow: number | null) =>
      routeChecked(
        channel(
          [sluice],
          { initial: { kind: 'dam', chainage: 500, stageAbove, stageBelow } },
          flat,
        ),
      );
    for (const low of [1, null]) {
      const there = fill(4, low);
      const back = fill(low, 4);
      expect(there.structures![0].peak.flow).toBeGreaterThan(15);
      there.structures![0].flow.forEach((q, k) => {
        expect(back.structures![0].flow[k]).toBeCloseTo(-q, 6);
      });
    }
    expect(fill(null, null).structures![0].peak.flow).toBe(0);
  });

  it('keeps still water still', () => {
    const result = routeChecked(channel([sluice], { initial: { kind: 'still', stage: 2 } }));
    expect(result.cells.peakVelocity.every((v) => v === 0)).toBe(true);
  });

  it('raised clear of the water passes what its sill does', () => {
    const clear = { ...sluice, width: 20, openings: [9], sill: 2 };
    const result = routeChecked(
      channel([clear], {
        upstream: { kind: 'inflow', ...steadyFlow(30) },
        downstream: { kind: 'stage', ...steadyStage(1.5) },
        initial: { kind: 'steady' },
        numerics,
      }),
    );
    expect(last(result.structures![0].regime)).toBe('free');
  });
});
