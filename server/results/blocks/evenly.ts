/** At most `limit` of the indexes 0..count-1, evenly spread, the first and the last among them. */
export function evenly(count: number, limit: number): Int32Array {
  const kept = Math.min(count, Math.max(limit, Math.min(count, 2)));
  const step = kept > 1 ? (count - 1) / (kept - 1) : 0;
  return Int32Array.from({ length: kept }, (_, k) => Math.round(k * step));
}
