import type { RunResiduals } from './types';

/** A gauge this near to a place stands at it, m: no river falls a centimetre on the way. */
const NEAR = 1;

/** What a gauge at a place recorded of a quantity, at times in s from the start of the run; null: nothing that can be compared. */
export function gaugeRecordAt(
  residuals: RunResiduals | null,
  at: number,
  quantity: 'stage' | 'flow',
): { times: number[]; values: number[] } | null {
  const fit = residuals?.gauges.find(
    (gauge) => gauge.series && gauge.quantity === quantity && Math.abs(gauge.chainage - at) <= NEAR,
  );
  return fit?.series ? { times: fit.series.times, values: fit.series.observed } : null;
}
