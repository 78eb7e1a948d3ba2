import { solveBanded } from '../../../server/solvers/initial/solveBanded';
import { seededRandom } from '../../helpers/solvers/seededRandom';

/** A banded matrix filled by `value`, and its product with `x`. */
function system(size: number, half: number, value: (r: number, c: number) => number) {
  const stride = 3 * half + 1;
  const band = new Float64Array(size * stride);
  const x = Float64Array.from({ length: size }, (_, k) => Math.sin(k + 1));
  const b = new Float64Array(size);
  for (let r = 0; r < size; r++) {
    for (let c = Math.max(0, r - half); c <= Math.min(size - 1, r + half); c++) {
      const m = value(r, c);
      band[r * stride + c - r + half] = m;
      b[r] += m * x[c];
    }
  }
  return { band, x, b };
}

describe('banded elimination', () => {
  it.each([
    [1, 1],
    [2, 3],
    [40, 2],
    [60, 7],
  ])('finds the solution of %d equations with %d diagonals on either side', (size, half) => {
    const random = seededRandom(size);
    const { band, x, b } = system(size, half, () => random() - 0.5);
    expect(solveBanded(band, half, b)).toBe(true);
    // Random matrices of this size have condition numbers of some 1e3.
    b.forEach((found, k) => expect(Math.abs(found - x[k])).toBeLessThan(1e-10));
  });

  it('exchanges rows where the diagonal is 0', () => {
    const { band, x, b } = system(8, 1, (r, c) => (r === c ? 0 : 1 + r));
    expect(solveBanded(band, 1, b)).toBe(true);
    b.forEach((found, k) => expect(found).toBeCloseTo(x[k], 12));
  });

  it('says where there is no solution', () => {
    const { band, b } = system(5, 1, (r) => (r === 2 ? 0 : 1));
    expect(solveBanded(band, 1, b)).toBe(false);
    expect(solveBanded(new Float64Array(4 * 5).fill(NaN), 1, new Float64Array(5))).toBe(false);
  });
});
