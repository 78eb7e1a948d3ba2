import { parseTyped } from '@/components/ui/parseTyped';
import type { Fault } from '@/shared/errors';
import { fromSi, toSi, UNITS, type Quantity, type UnitSystem } from '@/shared/units/units';

/** A column of a table that is typed or pasted in the study's units. */
export interface TextColumn {
  title: string;
  quantity: Quantity;
}

export interface ColumnsReading {
  /** One array a column, SI. */
  columns: number[][];
  /** Clock time of the first row, where times are dates. */
  startsAt?: string;
  /** How the text was understood, in words. */
  understood: string;
  faults: Fault[];
}

/** Reads rows of plain numbers: columns between tabs, semicolons, spaces, or commas where the decimals have points. */
export function readColumns(
  text: string,
  columns: readonly TextColumn[],
  system: UnitSystem,
): ColumnsReading {
  const lines = text.split(/\r?\n/);
  const split = splitter(lines, columns.length);
  const read: number[][] = columns.map(() => []);
  const faults: Fault[] = [];
  let seen = 0;
  lines.forEach((line, index) => {
    if (line.trim() === '') return;
    const cells = split(line.trim());
    const values = cells.slice(0, columns.length).map(parseTyped);
    const isHeading = seen === 0 && values.every((value) => value === null || Number.isNaN(value));
    if (isHeading) return;
    seen += 1;
    columns.forEach(({ title, quantity }, at) => {
      const value = values[at];
      if (value === undefined || value === null || Number.isNaN(value))
        faults.push({
          path: `line ${index + 1}`,
          message: `Line ${index + 1}: ${title} ${cells[at] ? `“${cells[at]}” is not a number` : 'is missing'}.`,
        });
      else read[at].push(toSi(value, quantity, system));
    });
  });
  const units = columns.map(
    ({ title, quantity }) => `${title} in ${UNITS[system][quantity].symbol}`,
  );
  return {
    columns: read,
    understood: `${seen} ${seen === 1 ? 'row' : 'rows'}: ${units.join(', ')}.`,
    faults,
  };
}

/** Values as they would be typed, with a heading line. */
export function writeColumns(
  values: readonly (readonly number[])[],
  columns: readonly TextColumn[],
  system: UnitSystem,
): string {
  const count = values[0]?.length ?? 0;
  if (count === 0) return '';
  const heading = columns.map(
    ({ title, quantity }) => `${title} ${UNITS[system][quantity].symbol}`,
  );
  const rows = Array.from({ length: count }, (_, row) =>
    columns.map(({ quantity }, at) => plain(fromSi(values[at][row], quantity, system))),
  );
  return [heading, ...rows].map((cells) => cells.join('\t')).join('\n');
}

/** Up to nine digits, so that a conversion of units leaves no tail. */
export const plain = (value: number): string => String(Number(value.toPrecision(9)));

function splitter(lines: readonly string[], count: number): (line: string) => string[] {
  const filled = lines.filter((line) => line.trim() !== '');
  const trim = (cells: string[]) => cells.map((cell) => cell.trim());
  if (filled.some((line) => line.includes('\t'))) return (line) => trim(line.split('\t'));
  if (filled.some((line) => line.includes(';'))) return (line) => trim(line.split(';'));
  const last = filled[filled.length - 1] ?? '';
  const commas = last.split(',').length - 1;
  if (commas === count - 1 && !/\s/.test(last.trim().replace(/,\s+/g, ',')))
    return (line) => trim(line.split(','));
  return (line) => line.split(/\s+/);
}
