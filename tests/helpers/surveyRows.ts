import * as XLSX from 'xlsx';
import type { MatchChoice } from '../../shared/surveys/types';
import { readSurvey, type SurveyReadingOptions } from '../../server/imports/survey/readSurvey';

export type Row = (string | number | Date | null)[];

export const HEADINGS = ['Section', 'Chainage (m)', 'Offset (m)', 'Elevation (m)'];

/** Three sound sections of five points each, as rows below `HEADINGS`; row 2 of the sheet is the first. */
export const soundRows = (): Row[] =>
  [0, 1, 2].flatMap((s) =>
    [0, 1, 2, 3, 4].map((i): Row => [`XS-0${s + 1}`, 500 * s, 5 * i, 20 - s + Math.abs(i - 2)]),
  );

export const workbookOf = (sheets: Record<string, Row[]>): Buffer => {
  const book = XLSX.utils.book_new();
  for (const [name, rows] of Object.entries(sheets))
    XLSX.utils.book_append_sheet(book, XLSX.utils.aoa_to_sheet(rows), name);
  return XLSX.write(book, { type: 'buffer', bookType: 'xlsx', compression: true }) as Buffer;
};

export const sheetOf = (rows: Row[], headings: Row = HEADINGS): Buffer =>
  workbookOf({ Main: [headings, ...rows] });

export const read = (bytes: Buffer, options: Partial<SurveyReadingOptions> = {}) =>
  readSurvey(bytes, { fileName: 'survey.xlsx', choice: null, defaultUnit: 'm', ...options });

export const readText = (text: string | Buffer, options: Partial<SurveyReadingOptions> = {}) =>
  read(Buffer.from(text as string), { fileName: 'survey.csv', ...options });

export const choose = (
  columns: MatchChoice['columns'],
  decimal: MatchChoice['decimal'] = 'auto',
): MatchChoice => ({ columns, decimal });

/** Faults alone, as `place: title`, for tests that look at places. */
export const told = (reading: ReturnType<typeof read>, severity: 'fault' | 'doubt' = 'fault') =>
  reading.faults
    .filter((fault) => fault.severity === severity)
    .map(({ sheet, row, lastRow, column, title }) => {
      const rows = row === null ? '' : lastRow === null ? ` ${row}` : ` ${row}-${lastRow}`;
      return `${sheet}${rows}${column ? ` ${column}` : ''}: ${title}`;
    });
