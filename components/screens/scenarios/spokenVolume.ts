import { formatNumber } from '@/shared/units/format';
import { fromSi, UNITS, type UnitSystem } from '@/shared/units/units';

/** A volume with three digits or so, as it is said: `43.1 million m³`, `12,400 m³`. m³ in. */
export function spokenVolume(si: number, system: UnitSystem): string {
  const { symbol } = UNITS[system].volume;
  const value = fromSi(si, 'volume', system);
  if (value >= 1e8) return `${formatNumber(value / 1e6, 0)} million ${symbol}`;
  if (value >= 1e6) return `${formatNumber(value / 1e6, 1)} million ${symbol}`;
  return `${formatNumber(Number(value.toPrecision(3)), 0)} ${symbol}`;
}
