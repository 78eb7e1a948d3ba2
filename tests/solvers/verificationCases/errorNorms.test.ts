import { errorNorms, observedOrder } from '@/server/verificationCases/errorNorms';
import { isWithin } from '@/shared/verificationCases/isWithin';

describe('error norms', () => {
  it('by hand: errors 1, 2, 2 and one that does not count', () => {
    const norms = errorNorms([1, 4, 8, 100], [2, 2, 6, 0], (i) => i < 3);
    expect(norms.l1).toBeCloseTo(5 / 3, 15);
    expect(norms.l2).toBeCloseTo(Math.sqrt(3), 15);
    expect(norms.max).toBe(2);
  });

  it('order from two grids', () => {
    // 4 times less on twice the cells: 2; 9 times less on three times the cells: 2.
    expect(observedOrder({ cells: 10, error: 4e-2 }, { cells: 20, error: 1e-2 }, 1)).toBeCloseTo(
      2,
      12,
    );
    expect(observedOrder({ cells: 10, error: 9 }, { cells: 30, error: 1 }, 1)).toBeCloseTo(2, 12);
    expect(observedOrder({ cells: 10, error: 4e-13 }, { cells: 20, error: 1e-13 }, 1)).toBeNull();
    expect(observedOrder({ cells: 10, error: 0 }, { cells: 20, error: 0 }, 0)).toBeNull();
  });
});

describe('the verdict', () => {
  it('an error may be as large as its bound, an order must be as large', () => {
    expect(isWithin('stageL1', 0.1, 0.1)).toBe(true);
    expect(isWithin('stageL1', 0.1001, 0.1)).toBe(false);
    expect(isWithin('flowOrder', 1.8, 1.8)).toBe(true);
    expect(isWithin('flowOrder', 1.79, 1.8)).toBe(false);
  });
  it('what could not be measured is not within', () => {
    expect(isWithin('stageOrder', null, 1)).toBe(false);
    expect(isWithin('stageL1', NaN, 1)).toBe(false);
  });
});
