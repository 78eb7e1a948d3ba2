/** What stands in a cell. Formulas are never evaluated: only the value that was saved with them counts. */
export type Cell =
  | { kind: 'number'; value: number }
  | { kind: 'text'; text: string }
  /** A date or time; ISO 8601 without zone. */
  | { kind: 'date'; text: string }
  /** A failed formula, e.g. `#REF!`. */
  | { kind: 'error'; text: string }
  /** A formula that was saved without its value. */
  | { kind: 'unsaved' };

/** One sheet. Rows and columns are 0-based and may have holes. */
export interface Grid {
  name: string;
  hidden: boolean;
  rows: (Cell | undefined)[][];
  /** 0-based rows that a filter or a person has hidden. */
  hiddenRows: number[];
}

/** A file as sheets of cells. */
export interface Workbook {
  kind: 'xlsx' | 'text';
  sheets: Grid[];
  /** Of a text file: what stood between its columns. */
  separator: string | null;
}
