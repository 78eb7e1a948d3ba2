import type { Fault } from '../errors';
import type { DecimalMark } from '../numbers/decimalMark';
import { parseNumber } from '../numbers/parseNumber';
import type { UnitSystem } from '../units/units';

export const TIME_UNITS = { s: 1, min: 60, h: 3600, d: 86_400 } as const;
export type TimeUnit = keyof typeof TIME_UNITS;
const UNIT_NAMES: Record<TimeUnit, string> = {
  s: 'seconds',
  min: 'minutes',
  h: 'hours',
  d: 'days',
};
const DAY = 86_400;

interface TimeRow {
  line: number;
  time: string;
}
interface Options {
  unitSystem: UnitSystem;
  timeUnit?: TimeUnit;
}
interface Times {
  /** s; null where the line has none. */
  seconds: (number | null)[];
  /** Clock time of the first, ISO 8601 in UTC, where there are dates. */
  startsAt?: string;
  understood: string;
}

/** The first column of a pasted table as seconds from start. The first rows tell what kind of times they all are. */
export function readTimes(
  rows: TimeRow[],
  heading: string,
  decimal: DecimalMark,
  options: Options,
  faults: Fault[],
): Times {
  const sample = rows.slice(0, 5).map(({ time }) => time);
  const most = (test: (text: string) => boolean) => sample.filter(test).length * 2 > sample.length;
  if (most((text) => DATE.test(text) || ISO.test(text))) return dateTimes(rows, options, faults);
  if (most((text) => CLOCK.test(text))) return clockTimes(rows, faults);
  const unit = unitOfHeading(heading) ?? options.timeUnit ?? 'h';
  const seconds = rows.map(({ line, time }) => {
    const value = parseNumber(time.replace(/\s*(h|hrs?|hours?|min|s)$/i, ''), decimal);
    if (value === null) faults.push(noTime(line, time));
    return value === null ? null : tidy(value * TIME_UNITS[unit]);
  });
  return { seconds, understood: `times in ${UNIT_NAMES[unit]}` };
}

const CLOCK = /^(\d{1,4}):([0-5]\d)(?::([0-5]\d)(?:\.\d+)?)?$/;
const ISO = /^(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})(?:[T\s]+(\d{1,2}):(\d{2})(?::(\d{2}))?)?/;
const DATE = /^(\d{1,2})[-/.](\d{1,2})[-/.](\d{4})(?:[T\s]+(\d{1,2}):(\d{2})(?::(\d{2}))?)?/;

/** Hours and minutes since start; where they fall back within a day, midnight has passed. */
function clockTimes(rows: TimeRow[], faults: Fault[]): Times {
  let days = 0;
  let before = -Infinity;
  const seconds = rows.map(({ line, time }) => {
    const match = CLOCK.exec(time);
    if (!match) {
      faults.push(noTime(line, time));
      return null;
    }
    const ofDay = Number(match[1]) * 3600 + Number(match[2]) * 60 + Number(match[3] ?? 0);
    if (ofDay < before && ofDay < DAY && before < DAY) days++;
    before = ofDay;
    return ofDay + days * DAY;
  });
  return {
    seconds: fromFirst(seconds),
    understood: 'times as hours and minutes, counted from the first',
  };
}

function dateTimes(rows: TimeRow[], { unitSystem }: Options, faults: Fault[]): Times {
  const monthFirst = isMonthFirst(rows, unitSystem);
  const seconds = rows.map(({ line, time }) => {
    const moment = momentOf(time, monthFirst);
    if (moment === null) faults.push(noTime(line, time));
    return moment;
  });
  const order = rows.some(({ time }) => DATE.test(time) && !ISO.test(time))
    ? `, ${monthFirst ? 'month' : 'day'} first`
    : '';
  const first = seconds.find((value) => value !== null);
  return {
    seconds: fromFirst(seconds),
    ...(first == null ? {} : { startsAt: new Date(first * 1000).toISOString() }),
    understood: `dates and times${order}, counted from the first`,
  };
}

/** Dates like 4/11/2026 are read by what the others allow; where both ways fit, as the study's country is used to. */
function isMonthFirst(rows: TimeRow[], unitSystem: UnitSystem): boolean {
  const parts = rows.flatMap(({ time }) => {
    const match = ISO.test(time) ? null : DATE.exec(time);
    return match ? [[Number(match[1]), Number(match[2])]] : [];
  });
  if (parts.some(([a]) => a > 12)) return false;
  if (parts.some(([, b]) => b > 12)) return true;
  return unitSystem === 'usCustomary' && rows.some(({ time }) => time.includes('/'));
}

function momentOf(text: string, monthFirst: boolean): number | null {
  const iso = ISO.exec(text);
  const match = iso ?? DATE.exec(text);
  if (!match) return null;
  const [a, b, c] = [match[1], match[2], match[3]].map(Number);
  const [year, month, day] = iso ? [a, b, c] : monthFirst ? [c, a, b] : [c, b, a];
  const [hour, minute, second] = [match[4], match[5], match[6]].map((part) => Number(part ?? 0));
  if (month < 1 || month > 12 || day < 1 || hour > 24 || minute > 59 || second > 59) return null;
  const moment = new Date(Date.UTC(year, month - 1, day, hour, minute, second));
  const isReal = new Date(Date.UTC(year, month - 1, day)).getUTCDate() === day;
  return isReal ? moment.getTime() / 1000 : null;
}

function fromFirst(seconds: (number | null)[]): (number | null)[] {
  const first = seconds.find((value) => value !== null) ?? 0;
  return seconds.map((value) => (value === null ? null : tidy(value - first)));
}

function unitOfHeading(heading: string): TimeUnit | null {
  const text = ` ${heading.toLowerCase()} `;
  if (/[\s([,_](s|sec|secs|seconds?|sekunden|secondes?|segundos?)[\s)\],]/.test(text)) return 's';
  if (/[\s([,_](min|mins|minutes?|minuten|minutos?)[\s)\],]/.test(text)) return 'min';
  if (/[\s([,_](h|hr|hrs|hours?|stunden|std|heures?|horas?)[\s)\],]/.test(text)) return 'h';
  if (/[\s([,_](d|days?|tage?|jours?|d[ií]as?)[\s)\],]/.test(text)) return 'd';
  return null;
}

const noTime = (line: number, text: string): Fault => ({
  path: `lines[${line}]`,
  message:
    text === ''
      ? `Line ${line} has no time.`
      : `Line ${line} has “${text.slice(0, 30)}” for a time. Write hours, hh:mm, or a date and time.`,
});

/** Takes away the noise of the conversion: 0.1 h is 360 s. */
const tidy = (seconds: number) => Math.round(seconds * 1e6) / 1e6;
