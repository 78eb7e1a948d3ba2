/**
 * A long series thinned for the width of a drawing without losing an extreme: of each bucket its first, lowest, highest
 * and last point stay, in their order. Short series come back as they are.
 */
export function thinSeries(
  x: ArrayLike<number>,
  y: ArrayLike<number>,
  buckets: number,
): { x: number[]; y: number[] } {
  const n = x.length;
  if (n <= 4 * buckets) return { x: Array.from(x), y: Array.from(y) };
  const out: { x: number[]; y: number[] } = { x: [], y: [] };
  for (let b = 0; b < buckets; b++) {
    const from = Math.floor((b * n) / buckets);
    const to = Math.floor(((b + 1) * n) / buckets);
    let low = from;
    let high = from;
    for (let i = from; i < to; i++) {
      if (y[i] < y[low]) low = i;
      if (y[i] > y[high]) high = i;
    }
    const kept = [from, Math.min(low, high), Math.max(low, high), to - 1];
    kept.forEach((i, k) => {
      if (k > 0 && kept[k - 1] === i) return;
      out.x.push(x[i]);
      out.y.push(y[i]);
    });
  }
  return out;
}
