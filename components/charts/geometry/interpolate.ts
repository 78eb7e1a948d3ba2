/** Index of the last entry that is not above `value`, for a rising row; 0 below the first, length - 2 above the last. */
export function bracket(row: ArrayLike<number>, value: number): number {
  let low = 0;
  let high = row.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (row[middle] <= value) low = middle;
    else high = middle;
  }
  return low;
}

/** Linear between given values, held before the first and after the last; NaN of an empty row. */
export function valueAt(x: ArrayLike<number>, y: ArrayLike<number>, at: number): number {
  const last = x.length - 1;
  if (last < 0) return NaN;
  if (last === 0 || at <= x[0]) return y[0];
  if (at >= x[last]) return y[last];
  const i = bracket(x, at);
  const width = x[i + 1] - x[i];
  return width > 0 ? y[i] + ((y[i + 1] - y[i]) * (at - x[i])) / width : y[i + 1];
}

/** Index of the entry nearest to `value` in a rising row; -1 of an empty one. */
export function nearestIndex(row: ArrayLike<number>, value: number): number {
  if (row.length < 2) return row.length - 1;
  const i = bracket(row, value);
  return value - row[i] <= row[i + 1] - value ? i : i + 1;
}
