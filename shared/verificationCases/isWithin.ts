import type { Measure } from './types';

/** An order must reach its bound, everything else must stay below it; what could not be measured fails. */
export const isOrder = (measure: Measure): boolean =>
  measure === 'stageOrder' || measure === 'flowOrder';

export function isWithin(measure: Measure, value: number | null, bound: number): boolean {
  if (value === null || !Number.isFinite(value)) return false;
  return isOrder(measure) ? value >= bound : value <= bound;
}
