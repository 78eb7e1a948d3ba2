/** A value at a time (s). */
export type Series = (time: number) => number;

/** Linear between the given values, held before the first and after the last. Times strictly increase. */
export function createSeries(times: readonly number[], values: readonly number[]): Series {
  const last = times.length - 1;
  let k = 0;
  return function valueAt(time) {
    if (time <= times[0]) return values[0];
    if (time >= times[last]) return values[last];
    while (time < times[k]) k--;
    while (time >= times[k + 1]) k++;
    const f = (time - times[k]) / (times[k + 1] - times[k]);
    return values[k] + f * (values[k + 1] - values[k]);
  };
}
