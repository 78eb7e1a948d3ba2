import { efficiency } from './residuals';
import type { GaugeFigures, TimeValues } from './types';

/**
 * A record against computed values at the same place. Times in s from the start of the run, both rising; the computed
 * series is taken linearly at the observed times, and only those count that lie within it. `matched` has the values that
 * were compared; null where fewer than two do.
 */
export function fitGauge(
  observed: TimeValues,
  computed: { times: ArrayLike<number>; values: ArrayLike<number> },
): { figures: GaugeFigures; matched: Matched } | null {
  const matched = match(observed, computed);
  const n = matched.times.length;
  if (n < 2) return null;
  let sum = 0;
  let squares = 0;
  for (let i = 0; i < n; i++) {
    const e = matched.computed[i] - matched.observed[i];
    sum += e;
    squares += e * e;
  }
  return {
    figures: {
      count: n,
      efficiency: efficiency(matched.observed, matched.computed),
      mean: sum / n,
      rms: Math.sqrt(squares / n),
      peak: peaks(matched, computed),
    },
    matched,
  };
}

export interface Matched {
  times: number[];
  observed: number[];
  computed: number[];
}

function match(
  observed: TimeValues,
  { times, values }: { times: ArrayLike<number>; values: ArrayLike<number> },
): Matched {
  const out: Matched = { times: [], observed: [], computed: [] };
  const last = times.length - 1;
  let k = 0;
  observed.times.forEach((t, i) => {
    if (last < 1 || t < times[0] || t > times[last]) return;
    while (k < last - 1 && times[k + 1] < t) k++;
    const share = (t - times[k]) / (times[k + 1] - times[k]);
    out.times.push(t);
    out.observed.push(observed.values[i]);
    out.computed.push(values[k] + share * (values[k + 1] - values[k]));
  });
  return out;
}

/** Both peaks within the record; a record that begins or ends with its highest value has not seen its peak. */
function peaks(
  { times, observed }: Matched,
  computed: { times: ArrayLike<number>; values: ArrayLike<number> },
): GaugeFigures['peak'] {
  const top = highest(observed);
  if (top === 0 || top === observed.length - 1) return null;
  let at = -1;
  for (let i = 0; i < computed.times.length; i++) {
    if (computed.times[i] < times[0] || computed.times[i] > times[times.length - 1]) continue;
    if (at < 0 || computed.values[i] > computed.values[at]) at = i;
  }
  if (at < 0) return null;
  return {
    observed: { value: observed[top], time: times[top] },
    computed: { value: computed.values[at], time: computed.times[at] },
    error: computed.values[at] - observed[top],
    delay: computed.times[at] - times[top],
  };
}

const highest = (values: readonly number[]) =>
  values.reduce((best, value, i) => (value > values[best] ? i : best), 0);
