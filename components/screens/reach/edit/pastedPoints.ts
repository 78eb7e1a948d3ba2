import { readColumns } from '@/components/screens/scenarios/columnsText';
import { pastePoints } from '@/shared/reaches/edit/pastePoints';
import type { Section } from '@/shared/surveys/types';
import type { UnitSystem } from '@/shared/units/units';

const OFFSET = { title: 'offset', quantity: 'length' } as const;
const ELEVATION = { title: 'elevation', quantity: 'elevation' } as const;

export interface Pasted {
  /** null where something could not be read; then nothing is taken over. */
  section: Section | null;
  rows: number;
  faults: string[];
}

/** Text from a spreadsheet set over the points from a cell on: one column or two, in the study's units. */
export function pastedPoints(
  section: Section,
  row: number,
  column: 0 | 1,
  text: string,
  system: UnitSystem,
): Pasted {
  const widest = Math.max(
    ...text
      .trim()
      .split(/\r?\n/)
      .map((line) => line.split('\t').length),
  );
  const both = column === 0 && (widest > 1 || /[;\s,]/.test(text.trim().split(/\r?\n/)[0]));
  const columns = both ? [OFFSET, ELEVATION] : [column === 0 ? OFFSET : ELEVATION];
  const reading = readColumns(text, columns, system);
  const faults = reading.faults.map(({ message }) => message);
  const count = reading.columns[0].length;
  if (count === 0 && faults.length === 0) faults.push('There is no row of numbers in it.');
  if (faults.length > 0) return { section: null, rows: 0, faults };
  const values = Array.from({ length: count }, (_, i) => reading.columns.map((cells) => cells[i]));
  const kind = both ? 'both' : column === 0 ? 'offset' : 'elevation';
  return { section: pastePoints(section, row, values, kind), rows: count, faults };
}
