import * as XLSX from 'xlsx';
import { LIMITS } from '../../../shared/limits';
import { tooLarge, unreadable } from '../importError';
import { packStored } from './packStored';
import type { Cell, Grid, Workbook } from './types';
import { unzipWorkbook, type PackedPart } from './unzipWorkbook';

/** Columns beyond are not looked at: no survey has them. */
const MAX_COLUMNS = 200;
const MAX_ROWS = LIMITS.upload.sections * LIMITS.upload.pointsPerSection;

/** Reads an XLSX. Throws an ImportError where it is damaged, locked, hostile or over a limit. */
export function readXlsx(bytes: Buffer): Workbook {
  const parts = unzipWorkbook(bytes);
  refuseHostile(parts);
  const book = parse(parts);
  if (book.SheetNames.length > LIMITS.upload.sheets)
    throw tooLarge(`The workbook has more than ${LIMITS.upload.sheets} sheets.`);
  const states = book.Workbook?.Sheets ?? [];
  const sheets = book.SheetNames.map((name, index) =>
    readSheet(name, book.Sheets[name], Boolean(states[index]?.Hidden)),
  );
  return { kind: 'xlsx', sheets, separator: null };
}

function refuseHostile(parts: PackedPart[]) {
  let rows = 0;
  for (const { name, content } of parts) {
    // No spreadsheet program writes declarations of its own; what has them means to expand.
    if (content.includes('<!DOCTYPE') || content.includes('<!ENTITY'))
      throw unreadable('The workbook holds declarations that no spreadsheet needs. Save it anew.');
    if (/worksheets\//i.test(name)) rows += countRows(content);
  }
  if (rows > MAX_ROWS)
    throw tooLarge(
      `The workbook has more than ${MAX_ROWS.toLocaleString('en-GB')} rows, which is more than ${LIMITS.upload.sections} sections can have.`,
    );
}

function countRows(content: Buffer): number {
  let count = 0;
  for (let at = content.indexOf('<row'); at >= 0; at = content.indexOf('<row', at + 4)) count++;
  return count;
}

function parse(parts: PackedPart[]): XLSX.WorkBook {
  const hasHidden = parts.some(({ content }) => content.includes('hidden="1"'));
  try {
    return XLSX.read(packStored(parts), {
      type: 'buffer',
      dense: true,
      cellDates: true,
      cellText: false,
      cellHTML: false,
      cellFormula: true,
      sheetStubs: true,
      // Row properties come with the styles; reading those costs memory, so only where something is hidden.
      cellStyles: hasHidden,
    });
  } catch {
    throw unreadable(
      'The workbook is damaged: it cannot be read. Open it, save it anew and send that.',
    );
  }
}

function readSheet(name: string, sheet: XLSX.WorkSheet | undefined, hidden: boolean): Grid {
  const rows: Grid['rows'] = [];
  const data = sheet?.['!data'] ?? [];
  data.forEach((cells, row) => {
    const line: Grid['rows'][number] = [];
    cells?.forEach((cell, column) => {
      if (column < MAX_COLUMNS) line[column] = readCell(cell);
    });
    rows[row] = line;
  });
  const hiddenRows: number[] = [];
  sheet?.['!rows']?.forEach((properties, row) => {
    if (properties?.hidden) hiddenRows.push(row);
  });
  return { name, hidden, rows, hiddenRows };
}

const ERROR_NAMES: Record<number, string> = {
  0x00: '#NULL!',
  0x07: '#DIV/0!',
  0x0f: '#VALUE!',
  0x17: '#REF!',
  0x1d: '#NAME?',
  0x24: '#NUM!',
  0x2a: '#N/A',
};

function readCell(cell: XLSX.CellObject | undefined): Cell | undefined {
  if (!cell) return undefined;
  const { v } = cell;
  if (cell.t === 'e') return { kind: 'error', text: ERROR_NAMES[Number(v)] ?? '#ERROR' };
  if (v instanceof Date) return { kind: 'date', text: v.toISOString().replace(/(\.000)?Z$/, '') };
  if (typeof v === 'number') return { kind: 'number', value: v };
  if (typeof v === 'boolean') return { kind: 'text', text: v ? 'TRUE' : 'FALSE' };
  if (typeof v === 'string' && v.trim() !== '') return { kind: 'text', text: v };
  return cell.f ? { kind: 'unsaved' } : undefined;
}
