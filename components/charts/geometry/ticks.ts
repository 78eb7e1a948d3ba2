import { scaleLinear } from 'd3-scale';
import type { Extent } from './frame';

/** Round values within the extent, about as many as there is room for. */
export function valueTicks([low, high]: Extent, lengthPx: number, pxPerTick: number): number[] {
  const count = Math.max(2, Math.floor(lengthPx / pxPerTick));
  return scaleLinear([low, high], [0, 1]).ticks(count);
}

/** Decimals that tell one tick from the next. */
export function tickDecimals(ticks: readonly number[]): number {
  if (ticks.length < 2) return 0;
  const step = Math.abs(ticks[1] - ticks[0]);
  return Math.min(6, Math.max(0, -Math.floor(Math.log10(step) + 1e-9)));
}

const MINUTE = 60;
const HOUR = 3600;
const STEPS = [
  1,
  2,
  5,
  10,
  30,
  MINUTE,
  2 * MINUTE,
  5 * MINUTE,
  10 * MINUTE,
  20 * MINUTE,
  30 * MINUTE,
  HOUR,
  2 * HOUR,
  3 * HOUR,
  6 * HOUR,
  12 * HOUR,
  24 * HOUR,
  48 * HOUR,
  96 * HOUR,
  240 * HOUR,
  720 * HOUR,
];

export interface TimeTicks {
  /** s. */
  values: number[];
  /** What the labels count in, and its length in s. */
  unit: 'h' | 'min' | 's';
  unitSeconds: number;
}

/** Ticks of a time axis, s: quarter days, hours, minutes or seconds as the length of the run asks for. */
export function timeTicks([low, high]: Extent, lengthPx: number, pxPerTick: number): TimeTicks {
  const span = Math.max(high - low, 1e-9);
  const wanted = span / Math.max(1, lengthPx / pxPerTick);
  const step = STEPS.find((each) => each >= wanted) ?? Math.ceil(wanted / 86400) * 86400;
  const first = Math.ceil(low / step - 1e-9);
  const last = Math.floor(high / step + 1e-9);
  const values = Array.from({ length: last - first + 1 }, (_, i) => (first + i) * step);
  const unit = timeUnit(span);
  return { values, unit, unitSeconds: UNIT_SECONDS[unit] };
}

const UNIT_SECONDS = { h: HOUR, min: MINUTE, s: 1 };

/** A dam break over minutes is told in minutes, a flood in hours. */
export function timeUnit(span: number): TimeTicks['unit'] {
  if (span >= 3 * HOUR) return 'h';
  return span >= 5 * MINUTE ? 'min' : 's';
}
