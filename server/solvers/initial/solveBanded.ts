/**
 * Solves M x = b for a matrix with `half` diagonals on either side of the main one, by Gaussian elimination with
 * partial pivoting (Golub and Van Loan 2013, Matrix Computations, section 4.3). `band` holds M row by row, 3 half + 1
 * numbers each: element (r, c) at r (3 half + 1) + c - r + half, the last `half` of a row 0, for what pivoting fills in. It is
 * overwritten; `x` holds b and then the solution. False where M is singular to the bit or holds no numbers.
 */
export function solveBanded(band: Float64Array, half: number, x: Float64Array): boolean {
  const size = x.length;
  const stride = 3 * half + 1;
  const { abs, min } = Math;

  for (let k = 0; k < size; k++) {
    const last = min(size - 1, k + half);
    const end = min(size - 1, k + 2 * half);
    const top = k * stride + half - k;
    let pivot = k;
    let largest = abs(band[top + k]);
    for (let r = k + 1; r <= last; r++) {
      const size = abs(band[r * stride + half - r + k]);
      if (size > largest) {
        largest = size;
        pivot = r;
      }
    }
    if (!(largest > 0 && largest < Infinity)) return false;
    if (pivot !== k) {
      const other = pivot * stride + half - pivot;
      for (let c = k; c <= end; c++) {
        const kept = band[top + c];
        band[top + c] = band[other + c];
        band[other + c] = kept;
      }
      const kept = x[k];
      x[k] = x[pivot];
      x[pivot] = kept;
    }
    const inverse = 1 / band[top + k];
    for (let r = k + 1; r <= last; r++) {
      const row = r * stride + half - r;
      const factor = band[row + k] * inverse;
      if (factor === 0) continue;
      for (let c = k + 1; c <= end; c++) band[row + c] -= factor * band[top + c];
      x[r] -= factor * x[k];
    }
  }
  for (let k = size - 1; k >= 0; k--) {
    const top = k * stride + half - k;
    const end = min(size - 1, k + 2 * half);
    let sum = x[k];
    for (let c = k + 1; c <= end; c++) sum -= band[top + c] * x[c];
    x[k] = sum / band[top + k];
  }
  return true;
}
