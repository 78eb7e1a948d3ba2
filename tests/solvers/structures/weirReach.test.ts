import { routeCase } from '@/server/solvers';
import type { WeirInput } from '@/shared/case/structures';
import { GRAVITY, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { channel, last } from './structureCases';

const weir: WeirInput = {
  kind: 'weir',
  id: 'weir',
  chainage: 500,
  form: 'broad',
  coefficient: 0.9,
  crest: [
    [0, 3],
    [20, 3],
  ],
};
const base = 0.9 * (2 / 3) ** 1.5 * Math.sqrt(GRAVITY) * 20;
const numerics = { cellSize: 20, duration: 3600, outputInterval: 600 };

describe('a weir in a reach', () => {
  it.each([
    ['free', 2.5],
    ['drowned', 4.2],
  ])('%s: the stages on both sides are those of the formula', (regime, tail) => {
    const result = routeChecked(
      channel([weir], {
        upstream: { kind: 'inflow', ...steadyFlow(40) },
        downstream: { kind: 'stage', ...steadyStage(tail) },
        initial: { kind: 'steady' },
        numerics,
      }),
    );
    const { flow, stageUp, stageDown, regime: regimes } = result.structures![0];
    expect(last(regimes)).toBe(regime);
    expect(last(flow)).toBeCloseTo(40, 3);
    // Bed of the cell above the weir: 0.255 m.
    const head = last(stageUp) - 3;
    const depth = last(stageUp) - 0.255;
    const energy = head + (40 / (20 * depth)) ** 2 / (2 * GRAVITY);
    const tailHead = Math.max(0, last(stageDown) - 3);
    // Broad-crested weir by energy head (Bos 1989), drowned by Villemonte (1947).
    const expected = base * energy ** 1.5 * (1 - (tailHead / head) ** 1.5) ** 0.385;
    expect(expected / 40).toBeCloseTo(1, 4);
    expect(result.warnings.map(({ code }) => code)).not.toContain('initialNotSettled');
  });

  it('keeps still water still, above and below its crest', () => {
    for (const stage of [1.5, 3.8]) {
      const result = routeChecked(channel([weir], { initial: { kind: 'still', stage } }));
      expect(result.cells.peakVelocity.every((v) => v === 0)).toBe(true);
      expect(result.cells.finalStage.every((eta) => eta === stage)).toBe(true);
    }
    const pools = { kind: 'dam', chainage: 500, stageAbove: 2.9, stageBelow: 1.2 } as const;
    const result = routeChecked(channel([weir], { initial: pools }));
    expect(result.cells.peakVelocity.every((v) => v === 0)).toBe(true);
  });

  it('works alike in both directions', () => {
    const flat = { fall: 0 };
    const fill = (stageAbove: number | null, stageBelow: number | null) =>
      routeChecked(
        channel([weir], { initial: { kind: 'dam', chainage: 500, stageAbove, stageBelow } }, flat),
      );
    const there = fill(5, 1);
    const back = fill(1, 5);
    expect(there.structures![0].peak.flow).toBeGreaterThan(50);
    there.structures![0].flow.forEach((q, k) => {
      expect(back.structures![0].flow[k]).toBeCloseTo(-q, 9);
    });
    there.cells.finalStage.forEach((eta, k) => {
      expect(back.cells.finalStage[back.cells.finalStage.length - 1 - k]).toBeCloseTo(eta, 9);
    });
  });

  it('is dry on either side or both', () => {
    const fill = (stageAbove: number | null, stageBelow: number | null) =>
      routeChecked(
        channel([weir], { initial: { kind: 'dam', chainage: 500, stageAbove, stageBelow } }),
      );
    expect(fill(null, null).structures![0].peak.flow).toBe(0);
    expect(fill(4, null).structures![0].peak.flow).toBeGreaterThan(10);
    expect(fill(null, 4).structures![0].peak.flow).toBeLessThan(-10);
  });

  it('takes hardly more steps than the reach alone, and settles between two pools', () => {
    const initial = { kind: 'dam', chainage: 500, stageAbove: 4.5, stageBelow: 4 } as const;
    const long = { ...numerics, duration: 7200 };
    const withWeir = routeChecked(channel([weir], { initial, numerics: long }));
    const alone = routeCase(channel([], { initial, numerics: long }));
    expect(withWeir.steps).toBeLessThan(1.1 * alone.steps);
    const { stageUp, stageDown } = withWeir.structures![0];
    expect(Math.abs(last(stageUp) - last(stageDown))).toBeLessThan(0.1);
  });

  it('is a sharp one by its stage and Rehbock', () => {
    const sharp: WeirInput = { ...weir, form: 'sharp', coefficient: undefined };
    delete sharp.coefficient;
    const result = routeChecked(
      channel([sharp], {
        upstream: { kind: 'inflow', ...steadyFlow(30) },
        downstream: { kind: 'stage', ...steadyStage(1.5) },
        initial: { kind: 'steady' },
        numerics,
      }),
    );
    const head = last(result.structures![0].stageUp) - 3;
    // Rehbock's short form (Henderson 1966), P = 3 - 0.255 m.
    const q = (0.611 + (0.08 * head) / 2.745) * (2 / 3) * Math.sqrt(2 * GRAVITY) * 20 * head ** 1.5;
    expect(q).toBeCloseTo(30, 2);
  });
});
