import * as XLSX from 'xlsx';

export type SheetRows = (string | number | null)[][];

export interface SheetToWrite {
  name: string;
  rows: SheetRows;
  /** Widths of the columns in letters. */
  widths?: number[];
}

/**
 * An XLSX of plain values. Text is written as text whatever it begins with, so that nothing in it becomes a formula;
 * see CWE-1236, improper neutralisation of formula elements.
 */
export function writeWorkbook(sheets: SheetToWrite[]): Buffer {
  const book = XLSX.utils.book_new();
  for (const { name, rows, widths } of sheets) {
    const sheet = XLSX.utils.aoa_to_sheet(rows);
    if (widths) sheet['!cols'] = widths.map((wch) => ({ wch }));
    XLSX.utils.book_append_sheet(book, sheet, name);
  }
  return XLSX.write(book, { type: 'buffer', bookType: 'xlsx', compression: true }) as Buffer;
}
