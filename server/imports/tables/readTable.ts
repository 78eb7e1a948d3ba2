import { pasteTable, type TableOptions } from '../../../shared/scenarios/pasteTable';
import type { TableReading } from '../../../shared/scenarios/types';
import { unreadable } from '../importError';
import { isNumeric } from '../numbers/isNumeric';
import { cellText } from '../workbook/cellText';
import { decodeText } from '../workbook/decodeText';
import { readXlsx } from '../workbook/readXlsx';
import { sniffFormat } from '../workbook/sniffFormat';
import type { Cell, Grid } from '../workbook/types';

/** Times of day that stand alone are dates near the year 1900 in a workbook. */
const DAY_ZERO = Date.UTC(1899, 11, 30);
const LAST_BARE_YEAR = 1901;

/** A table of values against time from a file: a text file as it would be pasted, or the first sheet of numbers of an XLSX. */
export function readTable(bytes: Buffer, fileName: string, options: TableOptions): TableReading {
  if (sniffFormat(bytes) === 'text') return pasteTable(decodeText(bytes), options);
  const sheets = readXlsx(bytes).sheets.filter(({ hidden }) => !hidden);
  const sheet = sheets.find(({ rows }) => rows.some((row) => (row ?? []).some(isValue)));
  if (!sheet) throw unreadable(`${fileName} holds no table of numbers.`);
  const reading = pasteTable(asText(sheet), options);
  const where = sheets.length > 1 ? `Sheet ${sheet.name}: ` : '';
  return { ...reading, understood: `${where}${reading.understood}` };
}

const isValue = (cell: Cell | undefined) => cell?.kind === 'date' || isNumeric(cell);

/** Columns are kept from the first that holds numbers; titles above the table fall away, line numbers stay the sheet's. */
function asText({ rows }: Grid): string {
  const first = rows.findIndex((row) => (row ?? []).filter(isValue).length >= 2);
  const start = first < 0 ? 0 : first;
  const left = (rows[start] ?? []).findIndex(isValue);
  const hasHeading = start > 0 && (rows[start - 1] ?? []).slice(left).filter(Boolean).length >= 2;
  return Array.from(rows, (row, index) => {
    if (!row || index < start - (hasHeading ? 1 : 0)) return '';
    const texts = Array.from(row.slice(left), (cell) => timeOrText(cell).replaceAll('\t', ' '));
    return texts.join('\t').trimEnd();
  }).join('\n');
}

function timeOrText(cell: Cell | undefined): string {
  if (cell?.kind !== 'date') return cellText(cell);
  const moment = Date.parse(`${cell.text}Z`);
  if (new Date(moment).getUTCFullYear() > LAST_BARE_YEAR) return cell.text;
  const seconds = Math.round((moment - DAY_ZERO) / 1000);
  const two = (value: number) => String(Math.floor(value)).padStart(2, '0');
  return `${two(seconds / 3600)}:${two((seconds % 3600) / 60)}:${two(seconds % 60)}`;
}
