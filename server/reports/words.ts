import { formatClock, formatDuration, formatWithUnit } from '../../shared/units/format';
import type { Quantity, UnitSystem } from '../../shared/units/units';
import type { ReportFacts } from './types';

const day = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});
const minute = new Intl.DateTimeFormat('en-GB', {
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC',
});

/** `1 December 2026, 09:40 UTC`. */
export const momentText = (iso: string): string =>
  `${dayText(iso)}, ${minute.format(new Date(iso))} UTC`;
export const dayText = (iso: string): string => day.format(new Date(iso));

/** `14 h 20`, with the clock time where the run has one. */
export function timeText(seconds: number, { run }: ReportFacts): string {
  const fromStart = formatDuration(seconds);
  return run.startsAt ? `${fromStart} (${formatClock(run.startsAt, seconds)})` : fromStart;
}

/** How numbers are written in this report, e.g. `44.66 m`. */
export const unitsOf =
  (system: UnitSystem) =>
  (si: number, quantity: Quantity): string =>
    formatWithUnit(si, quantity, system);

/** `7K4Q-…`: the code as it is printed, in groups of four. */
export const codeText = (code: string): string =>
  (code.replaceAll('-', '').match(/.{1,4}/g) ?? []).join('-');
