import { formatClock, formatDuration, formatNumber } from '@/shared/units/format';
import { timeUnit } from './ticks';

/** A moment as it is read out: hours and minutes, or minutes and seconds of a short run; with the clock where known. */
export function timeWords(t: number, span: number, startsAt: string | null): string {
  const fromStart = shortTime(t, span);
  return startsAt ? `${fromStart}, ${formatClock(startsAt, t)}` : fromStart;
}

/** The same within a sentence: `22 h 30 after start, 15 Nov, 04:30`. */
export function momentWords(t: number, span: number, startsAt: string | null): string {
  const fromStart = `${shortTime(t, span)} after start`;
  return startsAt ? `${fromStart}, ${formatClock(startsAt, t)}` : fromStart;
}

/** Time from start with the digits that a run of this length deserves, s. */
export function shortTime(t: number, span: number): string {
  const unit = timeUnit(span);
  if (unit === 'h') return formatDuration(t);
  if (unit === 's') return `${formatNumber(t, span < 60 ? 1 : 0)} s`;
  const seconds = Math.round(t);
  return `${Math.floor(seconds / 60)} min ${String(Math.abs(seconds % 60)).padStart(2, '0')}`;
}
