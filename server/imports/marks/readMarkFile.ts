import { readMarks, type MarksOptions } from '../../../shared/calibration/readMarks';
import type { MarksReading } from '../../../shared/calibration/types';
import { unreadable } from '../importError';
import { cellText } from '../workbook/cellText';
import { decodeText } from '../workbook/decodeText';
import { readXlsx } from '../workbook/readXlsx';
import { sniffFormat } from '../workbook/sniffFormat';
import type { Cell, Grid } from '../workbook/types';

/** Marks from a file: a text file as it would be pasted, or the first filled sheet of an XLSX, its lines numbered as there. */
export function readMarkFile(bytes: Buffer, fileName: string, options: MarksOptions): MarksReading {
  if (sniffFormat(bytes) === 'text') return readMarks(decodeText(bytes), options);
  const sheets = readXlsx(bytes).sheets.filter(({ hidden }) => !hidden);
  const sheet = sheets.find(({ rows }) => rows.some((row) => (row ?? []).some(Boolean)));
  if (!sheet) throw unreadable(`${fileName} holds no table.`);
  const reading = readMarks(asText(sheet), options);
  const where = sheets.length > 1 ? `Sheet ${sheet.name}: ` : '';
  return { ...reading, understood: `${where}${reading.understood}` };
}

const asText = ({ rows }: Grid): string =>
  Array.from(rows, (row) => Array.from(row ?? [], plain).join('\t')).join('\n');

/** A day without its midnight; nothing in a cell may look like the end of it. */
const plain = (cell: Cell | undefined) =>
  cellText(cell)
    .replace(/T00:00(:00)?(\.0+)?$/, '')
    .replaceAll(/[\t\r\n]+/g, ' ');
