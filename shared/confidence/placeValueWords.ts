import type { PlaceValues } from './types';
import { formatDuration, formatWithUnit } from '../units/format';
import type { UnitSystem } from '../units/units';

export const VALUE_NAMES: Record<keyof PlaceValues, string> = {
  peakStage: 'Peak stage',
  peakFlow: 'Peak flow',
  arrival: 'Arrival',
};

export function valueText(
  quantity: keyof PlaceValues,
  value: number | null,
  system: UnitSystem,
): string {
  if (quantity === 'arrival')
    return value === null || !Number.isFinite(value) ? 'never' : formatDuration(value);
  if (value === null) return 'no result';
  return formatWithUnit(value, quantity === 'peakStage' ? 'elevation' : 'flow', system);
}

/** With its sign and unit. */
export function changeWords(
  quantity: keyof PlaceValues,
  change: number,
  system: UnitSystem,
): string {
  if (quantity === 'arrival') return timeChange(change);
  const as = quantity === 'peakStage' ? 'depth' : 'flow';
  return signed(formatWithUnit(change, as, system), change);
}

/** What rounds to nothing has no sign. */
const signed = (text: string, value: number): string =>
  value > 0 && /[1-9]/.test(text) ? `+${text}` : text;

/** `−12 min` or `+1 h 05`. */
function timeChange(seconds: number): string {
  const minutes = Math.round(Math.abs(seconds) / 60);
  if (minutes === 0) return '0 min';
  const sign = seconds < 0 ? '−' : '+';
  return minutes < 60 ? `${sign}${minutes} min` : `${sign}${formatDuration(60 * minutes)}`;
}
