import type { Fault } from '../errors';
import { LIMITS } from '../limits';
import { decimalMark, type DecimalMark } from '../numbers/decimalMark';
import { parseNumber } from '../numbers/parseNumber';
import { UNITS, type UnitSystem } from '../units/units';
import { readTimes, type TimeUnit } from './tableTimes';
import type { TableReading } from './types';

export interface TableOptions {
  quantity: 'flow' | 'stage';
  /** What values are in where no heading names a unit. */
  unitSystem: UnitSystem;
  /** What plain times are in where no heading says; hours by default. */
  timeUnit?: TimeUnit;
}

interface Row {
  /** 1-based. */
  line: number;
  time: string;
  value: string;
}

const VALUE_UNITS: [RegExp, number, string][] = [
  [/\b(m3\/?s|m³\/?s|cumecs?|m\^3\/s|m3 s-1)/i, 1, 'm³/s'],
  [/\b(cfs|ft3\/s|ft³\/s|cusecs?)\b/i, UNITS.usCustomary.flow.si, 'ft³/s'],
  [/\b(l\/s|lps)\b/i, 1e-3, 'l/s'],
];
const STAGE_UNITS: [RegExp, number, string][] = [
  [/[([\s,_](ft|feet)\b/i, UNITS.usCustomary.elevation.si, 'ft'],
  [/[([\s,_]m\b/i, 1, 'm'],
];

/**
 * Reads a table of values against time as it is pasted or typed: tabs, semicolons, commas or spaces between the columns, either decimal
 * mark, an optional heading row, times in seconds to days, as clock times, or as dates and times (the first is then the start).
 * Faults are told by line. Times come back in s, values in SI.
 */
export function pasteTable(text: string, options: TableOptions): TableReading {
  const lines = text.split(/\r\n|\n|\r/).map((content, i) => ({ line: i + 1, content }));
  const filled = lines.filter(({ content }) => content.trim() !== '');
  const faults: Fault[] = [];
  if (filled.length === 0) {
    faults.push({
      path: 'lines[1]',
      message: 'The table is empty. Paste two columns: time and value.',
    });
    return { times: [], values: [], understood: '', faults };
  }
  const separator = separatorOf(filled.map(({ content }) => content));
  const cut = filled.map(({ line, content }) => ({ line, cells: cells(content, separator) }));
  const heading = hasNoNumber(cut[0].cells) ? cut[0].cells : null;
  const body = heading ? cut.slice(1) : cut;
  const column = heading ? valueColumn(heading, options.quantity) : null;

  const rows: Row[] = [];
  for (const { line, cells: parts } of body) {
    const row = pick(parts, column);
    if (row) rows.push({ line, ...row });
    else faults.push(at(line, 'has one column. Give a time and a value.'));
  }
  if (body.length === 0)
    faults.push(at(cut[0].line, 'is all there is. Rows of numbers are missing.'));
  if (rows.length > LIMITS.hydrographPoints) {
    const most = LIMITS.hydrographPoints.toLocaleString('en-GB');
    faults.push(
      at(rows[LIMITS.hydrographPoints].line, `goes beyond ${most} rows. Thin the table out.`),
    );
    rows.length = LIMITS.hydrographPoints;
  }
  const decimal = decimalMark(
    rows.flatMap(({ time, value }) => [time, value]),
    null,
  );
  if (decimal.unclear)
    faults.push(
      at(
        rows[0].line,
        `reads both ways: does ${decimal.unclear} have decimals? Write a point before decimals.`,
      ),
    );

  const times = readTimes(rows, heading?.[0] ?? '', decimal.mark, options, faults);
  const unit = valueUnit(heading ?? [], options);
  const values = readValues(rows, decimal.mark, unit.si, faults);
  growing(rows, times.seconds, faults);
  const keep = faults.length === 0;
  return {
    times: keep ? (times.seconds as number[]) : [],
    values: keep ? (values as number[]) : [],
    ...(keep && times.startsAt !== undefined && { startsAt: times.startsAt }),
    understood: `${rows.length.toLocaleString('en-GB')} rows; ${times.understood}; values in ${unit.name}${decimal.mark === 'comma' ? '; decimal comma' : ''}.`,
    faults: faults.sort((a, b) => lineOf(a) - lineOf(b)).slice(0, LIMITS.upload.faults),
  };
}

const at = (line: number, message: string): Fault => ({
  path: `lines[${line}]`,
  message: `Line ${line} ${message}`,
});
const lineOf = ({ path }: Fault) => Number(/\d+/.exec(path)?.[0]);

function separatorOf(lines: string[]): string | RegExp {
  const share = (test: (line: string) => boolean) => lines.filter(test).length / lines.length;
  if (share((line) => line.includes('\t')) > 0.5) return '\t';
  if (share((line) => line.includes(';')) > 0.5) return ';';
  // With spaces between numbers a comma is of the decimals: `0,5  12,3`.
  if (share((line) => /\d\s+[-+]?[\d.,]+\s*$/.test(line)) > 0.5) return /\s+/;
  return ',';
}

function cells(content: string, separator: string | RegExp): string[] {
  // An empty last column is one all the same; only where spaces part the columns do they mean nothing at the ends.
  const line = typeof separator === 'string' ? content : content.trim();
  return joinDate(line.split(separator).map((part) => part.trim().replace(/^"(.*)"$/, '$1')));
}

/** A date and its time of day in two columns are one moment. */
function joinDate(parts: string[]): string[] {
  const isDate = /^\d{1,4}[-/.]\d{1,2}[-/.]\d{1,4}$/.test(parts[0]);
  const isClock = /^\d{1,2}:\d{2}(:\d{2})?$/.test(parts[1] ?? '');
  return isDate && isClock ? [`${parts[0]} ${parts[1]}`, ...parts.slice(2)] : parts;
}

const hasNoNumber = (parts: string[]) => !parts.some((part) => /^[-+−]?[\d.,]*\d/.test(part));

function valueColumn(heading: string[], quantity: TableOptions['quantity']): number | null {
  const words =
    quantity === 'flow'
      ? /flow|discharge|inflow|\bq\b|abfluss|d[ée]bit|caudal|gasto/i
      : /stage|level|elev|height|\bh\b|wasserstand|hauteur|nivel|cota/i;
  const found = heading.findIndex((cell, i) => i > 0 && words.test(cell));
  return found > 0 ? found : null;
}

function pick(parts: string[], column: number | null): Omit<Row, 'line'> | null {
  const value = parts[column ?? 1];
  return parts.length > 1 && value !== undefined ? { time: parts[0], value } : null;
}

function valueUnit(heading: string[], { quantity, unitSystem }: TableOptions) {
  const text = ` ${heading.slice(1).join(' ')}`;
  const named = (quantity === 'flow' ? VALUE_UNITS : STAGE_UNITS).find(([word]) => word.test(text));
  if (named) return { si: named[1], name: named[2] };
  const unit = UNITS[unitSystem][quantity === 'flow' ? 'flow' : 'elevation'];
  return { si: unit.si, name: unit.symbol };
}

function readValues(rows: Row[], decimal: DecimalMark, si: number, faults: Fault[]) {
  return rows.map(({ line, value }) => {
    const number = parseNumber(value, decimal);
    if (number === null)
      faults.push(
        at(
          line,
          value === ''
            ? 'has no value.'
            : `has “${value.slice(0, 30)}” for a value, which is no number.`,
        ),
      );
    return number === null ? null : number * si;
  });
}

function growing(rows: Row[], seconds: (number | null)[], faults: Fault[]) {
  for (let i = 1; i < rows.length; i++) {
    const [before, now] = [seconds[i - 1], seconds[i]];
    if (before !== null && now !== null && now <= before)
      faults.push(
        at(
          rows[i].line,
          now === before
            ? 'has the time of the line before. Each time stands once.'
            : 'goes back in time. Times grow from line to line.',
        ),
      );
  }
}
