import type { PlaceValues } from '@/shared/confidence/types';
import { formatDuration, formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';
import { signed, timeChange } from '../confidenceWords';

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
