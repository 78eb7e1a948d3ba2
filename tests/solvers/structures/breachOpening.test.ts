import { breachGrowth, openedHead } from '@/server/solvers/structures/breachOpening';
import { crestHead, crestOf } from '@/server/solvers/structures/crestFlow';
import type { BreachInput } from '@/shared/case/structures';

const crest = crestOf([
  [0, 12],
  [30, 10],
  [70, 10],
  [100, 13],
]);

describe('the opening of a breach', () => {
  it('cuts a trapezoid into the crest', () => {
    // A trapezoid wholly below a level crest, water below the crest: bottom and two sides, each exact.
    const level = crestOf([
      [0, 10],
      [100, 10],
    ]);
    const h = 3;
    const expected = 12 * h ** 1.5 + 2 * 0.4 * 1.5 * h ** 2.5;
    expect(openedHead(level, 5 + h, 40, 12, 5, 1.5)).toBeCloseTo(expected, 10);
    // Vertical sides.
    expect(openedHead(level, 5 + h, 40, 12, 5, 0)).toBeCloseTo(12 * h ** 1.5, 10);
  });

  it('agrees with a sum over fine strips where it meets a crest that slopes', () => {
    const ground = (x: number, centre: number, width: number, bottom: number, slope: number) => {
      const top = x < 30 ? 12 - x / 15 : x < 70 ? 10 : 10 + (x - 70) / 10;
      const beyond = Math.max(0, Math.abs(x - centre) - width / 2);
      return Math.min(top, bottom + beyond / slope);
    };
    for (const [z, centre, width, bottom, slope] of [
      [11.5, 50, 20, 4, 1],
      [11.5, 20, 30, 8, 2],
      [14, 85, 20, 9.5, 3],
      [9, 50, 10, 6, 1.4],
    ]) {
      const strips = 400_000;
      let sum = 0;
      for (let k = 0; k < strips; k++) {
        const x = ((k + 0.5) * 100) / strips;
        sum += Math.max(0, z - ground(x, centre, width, bottom, slope)) ** 1.5 * (100 / strips);
      }
      expect(openedHead(crest, z, centre, width, bottom, slope) / sum).toBeCloseTo(1, 6);
    }
  });

  it('is the crest alone before it begins', () => {
    expect(openedHead(crest, 12, 50, 0, 10, 1)).toBe(crestHead(crest, 12));
  });

  it('grows linear or like a sine over its formation time, or at once', () => {
    const of = (growth: 'linear' | 'sine', formationTime = 100) =>
      ({ growth, formationTime }) as BreachInput;
    expect(breachGrowth(of('linear'), -1)).toBe(0);
    expect(breachGrowth(of('linear'), 25)).toBe(0.25);
    expect(breachGrowth(of('sine'), 25)).toBeCloseTo(0.5 * (1 - Math.SQRT1_2), 12);
    expect(breachGrowth(of('sine'), 50)).toBeCloseTo(0.5, 12);
    expect(breachGrowth(of('sine'), 101)).toBe(1);
    expect(breachGrowth(of('linear', 0), 0)).toBe(1);
  });
});
