import { fromSi, UNITS, type Quantity, type UnitSystem } from './units';

/** Digits in groups of three by a comma, a point before the decimals, a true minus sign. */
export function formatNumber(value: number, decimals: number): string {
  if (!Number.isFinite(value)) return '–';
  const text = plain(decimals).format(Math.abs(value));
  return value < 0 && /[1-9]/.test(text) ? `−${text}` : text;
}

/** Made once: a chart that plays writes hundreds of numbers a second. */
const made: Intl.NumberFormat[] = [];
const plain = (decimals: number) =>
  (made[decimals] ??= new Intl.NumberFormat('en-GB', {
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  }));

/** An SI value in the study's units, without the symbol. Flows from 100 up carry no decimals. */
export function formatQuantity(si: number, quantity: Quantity, system: UnitSystem): string {
  const value = fromSi(si, quantity, system);
  const { decimals } = UNITS[system][quantity];
  const deserved = quantity === 'flow' && Math.abs(value) >= 100 ? 0 : decimals;
  return formatNumber(value, deserved);
}

/** The same with its symbol, e.g. `44.66 m`. */
export const formatWithUnit = (si: number, quantity: Quantity, system: UnitSystem): string =>
  `${formatQuantity(si, quantity, system)} ${UNITS[system][quantity].symbol}`;

/** A length that somebody chose, with no more digits than it needs, e.g. `25 m` or `12.5 m`. */
export function formatChosenLength(si: number, system: UnitSystem): string {
  const { decimals, symbol } = UNITS[system].length;
  const value = fromSi(si, 'length', system);
  const text = formatNumber(value, decimals);
  return `${decimals > 0 ? text.replace(/\.0+$/, '') : text} ${symbol}`;
}

/** A setting of any size with six figures at most and no zeros behind them, e.g. `0.001 m` or `9.80665 m/s²`. */
export const formatSetting = (si: number, quantity: Quantity, system: UnitSystem): string =>
  `${Number(fromSi(si, quantity, system).toPrecision(6))} ${UNITS[system][quantity].symbol}`;

/** Seconds from start as `6 h 07`; days are not split off: a flood is told in hours. */
export function formatDuration(seconds: number): string {
  const minutes = Math.round(seconds / 60);
  const sign = minutes < 0 ? '−' : '';
  const whole = Math.abs(minutes);
  return `${sign}${Math.floor(whole / 60)} h ${String(whole % 60).padStart(2, '0')}`;
}

/** Clock time of a moment of a run whose study has a start, e.g. `14 Nov 18:12`, in UTC as it was typed. */
export function formatClock(startIso: string, seconds: number): string {
  // To the whole minute, as `formatDuration` is: the two stand side by side.
  const at = Date.parse(startIso) + Math.round(seconds / 60) * 60_000;
  return Number.isFinite(at) ? clock.format(at) : '–';
}

const clock = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC',
});
