/**
 * Flow (m³/s) of a rating at a stage (m): linear between its points, from no flow at the bed to the first point, and on
 * along the last line above the last point.
 */
export function createRatingCurve(
  stages: readonly number[],
  flows: readonly number[],
  bed: number,
): (stage: number) => number {
  const first = stages.findIndex((stage) => stage > bed);
  const s = first < 0 ? [bed] : [bed, ...stages.slice(first)];
  // A point at or below the bed says what flows when the outlet is all but empty: nothing can.
  const q = first < 0 ? [0] : [0, ...flows.slice(first)];
  const last = s.length - 1;
  return function flowAt(stage) {
    if (last === 0 || stage <= bed) return 0;
    let k = 0;
    while (k + 2 <= last && stage > s[k + 1]) k++;
    return q[k] + ((stage - s[k]) / (s[k + 1] - s[k])) * (q[k + 1] - q[k]);
  };
}
