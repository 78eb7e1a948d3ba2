import { findRoot } from '@/server/solvers/exact/tools/findRoot';
import { integrate } from '@/server/solvers/exact/tools/integrate';

describe('findRoot', () => {
  it('finds roots to the last places', () => {
    expect(findRoot((x) => x * x - 2, 0, 2)).toBeCloseTo(Math.SQRT2, 14);
    expect(findRoot((x) => Math.cos(x) - x, 0, 1)).toBeCloseTo(0.7390851332151607, 14);
    expect(findRoot((x) => (x - 1) ** 9, -3, 4)).toBeCloseTo(1, 1);
    expect(findRoot((x) => (x < 0.3 ? -1 : 1), 0, 1)).toBeCloseTo(0.3, 14);
  });

  it('refuses a bracket without a change of sign', () => {
    expect(() => findRoot((x) => x * x + 1, -1, 1)).toThrow(RangeError);
  });
});

describe('integrate', () => {
  it('is exact for a polynomial of degree 31 and spectral for smooth functions', () => {
    expect(integrate((x) => 32 * x ** 31, 0, 1, 1)).toBeCloseTo(1, 13);
    expect(integrate(Math.exp, -1, 2)).toBeCloseTo(Math.exp(2) - Math.exp(-1), 13);
    expect(integrate(Math.exp, 2, -1)).toBeCloseTo(Math.exp(-1) - Math.exp(2), 13);
  });
});
