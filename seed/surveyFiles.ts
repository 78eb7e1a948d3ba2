import type { Section } from '../shared/surveys/types';
import { longTable } from '../server/workbooks/surveyTemplates';
import { writeWorkbook, type SheetRows } from '../server/workbooks/writeWorkbook';

/** Sections as the workbook that a surveyor sends. */
export const surveyFile = (sections: Section[]): Buffer =>
  writeWorkbook([{ ...longTable(sections), name: 'Main' }]);

const [CHAINAGE, OFFSET, ELEVATION] = [1, 2, 3];

/** A first attempt at it with the slips that are made in the field, each at its row. */
export function faultySurveyFile(sections: Section[]): Buffer {
  const { rows } = longTable(sections);
  const rowsOf = (id: string) => rows.filter(([section]) => section === id);
  const inBed = (row: SheetRows) => row[Math.floor(row.length / 2)];
  inBed(rowsOf('XS-07'))[ELEVATION] = null;
  const [before, slip] = rowsOf('XS-15').slice(9, 11);
  slip[OFFSET] = Number(before[OFFSET]) - 0.5;
  const far = inBed(rowsOf('XS-29'));
  far[ELEVATION] = Number(far[ELEVATION]) * 10;
  const place = rowsOf('XS-34')[0][CHAINAGE];
  for (const row of rowsOf('XS-35')) row[CHAINAGE] = place;
  return writeWorkbook([{ name: 'Main', rows }]);
}
