import type { Fault } from '../errors';
import { decimalMark, type DecimalMark } from '../numbers/decimalMark';
import { parseNumber } from '../numbers/parseNumber';
import { METRES_PER_FOOT, UNITS, type UnitSystem } from '../units/units';
import { readConfidence, readDay, readKind } from './markWords';
import { headingOf, MARK_COLUMNS, splitTable, type MarkColumn } from './markTable';
import { OBSERVATION_LIMITS } from './schemas';
import type { MarksReading } from './types';

export interface MarksOptions {
  unitSystem: UnitSystem;
  /** Given to marks whose row names no flood. */
  flood: string;
  /** First and last chainage of the reach, m; null before there is one. */
  reach: { from: number; to: number } | null;
}

type Row = { line: number } & Record<MarkColumn, string>;

/**
 * Marks as they are pasted or typed: chainage, level, kind, confidence, flood, day and note in the order of a heading row,
 * or in this order without one; only the first two are needed. Tabs, semicolons or commas part the columns, either decimal
 * mark. Faults are told by line. Values come back in SI.
 */
export function readMarks(text: string, options: MarksOptions): MarksReading {
  const lines = splitTable(text);
  if (lines.length === 0) return refused([{ path: 'lines[1]', message: 'The table is empty.' }]);
  const faults: Fault[] = [];
  const heading = headingOf(lines[0].cells);
  const places = heading?.places ?? MARK_COLUMNS.map((name, i) => [name, i] as const);
  const rows = lines.slice(heading ? 1 : 0).map(({ line, cells }): Row => {
    const named = MARK_COLUMNS.map((name) => {
      const at = places.find(([column]) => column === name)?.[1];
      return [name, (at === undefined ? undefined : cells[at]) ?? ''];
    });
    return { line, ...(Object.fromEntries(named) as Record<MarkColumn, string>) };
  });
  if (heading)
    for (const [name, words] of NEEDED)
      if (!places.some(([column]) => column === name))
        faults.push(at(lines[0].line, `has no column for the ${words}.`));
  if (faults.length > 0) return refused(faults);
  if (rows.length === 0) return refused([at(lines[0].line, 'is all there is: marks are missing.')]);
  if (rows.length > OBSERVATION_LIMITS.marksPerStudy)
    return refused([
      at(rows[OBSERVATION_LIMITS.marksPerStudy].line, 'goes beyond what a study can hold.'),
    ]);
  const { mark } = decimalMark(
    rows.flatMap(({ chainage, level }) => [chainage, level]),
    'point',
  );
  const numbers = (column: 'chainage' | 'level') => readColumn(rows, column, mark, faults);
  const [along, levels] = [numbers('chainage'), numbers('level')];
  const unit = chainageUnit(along, heading?.chainageUnit ?? null, options);
  const metre = heading?.levelUnit ?? levelUnit(options.unitSystem);

  const marks = rows.map((row, i) => {
    const kind = readKind(row.kind);
    const confidence = readConfidence(row.confidence);
    const day = readDay(row.day);
    const fault = (message: string) => faults.push(at(row.line, message));
    if (kind === null) fault(`has “${cut(row.kind)}” for what was seen. ${KINDS}`);
    if (confidence === null)
      fault(`has “${cut(row.confidence)}” for the confidence. Write good, fair or poor.`);
    if (day === undefined) fault(`has “${cut(row.day)}” for a day. Write it as 2024-01-09.`);
    const chainage = (along[i] ?? 0) * unit.si;
    const { reach } = options;
    if (along[i] !== null && reach && (chainage < reach.from - 1 || chainage > reach.to + 1))
      fault(
        `lies off the reach, which goes from ${inUnit(reach.from, unit)} to ${inUnit(reach.to, unit)}.`,
      );
    return {
      chainage,
      level: (levels[i] ?? 0) * metre.si,
      kind: kind ?? ('other' as const),
      confidence: confidence ?? ('fair' as const),
      flood: row.flood.trim() || options.flood,
      observedOn: day ?? null,
      note: row.note.trim(),
    };
  });
  if (faults.length > 0) return refused(faults.sort((a, b) => lineOf(a) - lineOf(b)).slice(0, 100));
  const count = marks.length === 1 ? 'One mark' : `${marks.length} marks`;
  return {
    marks,
    understood: `${count}; chainages in ${unit.name}, levels in ${metre.name}${mark === 'comma' ? '; decimal comma' : ''}.`,
    faults: [],
  };
}

const NEEDED = [
  ['chainage', 'chainage'],
  ['level', 'level of the water'],
] as const;
const KINDS = 'Write debris, stain, eyewitness, gauge peak or other.';

const refused = (faults: Fault[]): MarksReading => ({ marks: [], understood: '', faults });
const at = (line: number, message: string): Fault => ({
  path: `lines[${line}]`,
  message: `Line ${line} ${message}`,
});
const lineOf = ({ path }: Fault) => Number(/\d+/.exec(path)?.[0]);
const cut = (text: string) => text.trim().slice(0, 30);

function readColumn(
  rows: Row[],
  column: 'chainage' | 'level',
  mark: DecimalMark,
  faults: Fault[],
): (number | null)[] {
  return rows.map((row) => {
    const text = row[column];
    const value = parseNumber(text, mark);
    if (value === null)
      faults.push(
        at(
          row.line,
          text.trim() === ''
            ? `has no ${column}.`
            : `has “${cut(text)}” for the ${column}, which is no number.`,
        ),
      );
    return value;
  });
}

interface LengthUnit {
  name: string;
  si: number;
}
const METRES: LengthUnit = { name: 'm', si: 1 };
const FEET: LengthUnit = { name: 'ft', si: METRES_PER_FOOT };
const levelUnit = (system: UnitSystem) => (system === 'metric' ? METRES : FEET);

/** Without a word for it: the study's unit, unless every mark would then lie off the reach and in plain metres lies on it. */
function chainageUnit(
  values: (number | null)[],
  named: LengthUnit | null,
  { unitSystem, reach }: MarksOptions,
): LengthUnit {
  if (named) return named;
  const { symbol, si } = UNITS[unitSystem].chainage;
  const usual = { name: symbol, si };
  if (!reach) return usual;
  const on = (unit: LengthUnit) =>
    values.filter((v) => v !== null && v * unit.si >= reach.from - 1 && v * unit.si <= reach.to + 1)
      .length;
  return on(usual) === 0 && on(METRES) > 0 ? METRES : usual;
}

const inUnit = (si: number, { name, si: one }: LengthUnit) =>
  `${Number((si / one).toFixed(name === 'km' ? 2 : 0))} ${name}`;
