/** A table as it is typed: the text that is read, cut into cells. The text is what counts; its heading line stays with it. */
export interface TypedRows {
  heading: string;
  cells: string[][];
}

/** Cuts a text with tabs as `write` gives it; where it has no heading line yet, it gets `heading`. */
export function cutRows(text: string, heading: string, columns: number): TypedRows {
  const lines = text === '' ? [] : text.split('\n');
  const hasHeading = lines.length > 0 && /\p{L}/u.test(lines[0].split('\t')[0]);
  const rows = hasHeading ? lines.slice(1) : lines;
  return {
    heading: hasHeading ? lines[0] : heading,
    cells: (rows.length > 0 ? rows : ['']).map((line) => filled(line.split('\t'), columns)),
  };
}

export const joinRows = ({ heading, cells }: TypedRows): string =>
  [heading, ...cells.map((row) => row.join('\t'))].join('\n');

export const setCell = (rows: TypedRows, row: number, column: number, typed: string): TypedRows =>
  pasteCells(rows, row, column, typed.replaceAll(/[\t\n]/g, ' '));

/** An empty row below another. */
export function addRow({ heading, cells }: TypedRows, below: number): TypedRows {
  const empty = cells[0].map(() => '');
  return { heading, cells: [...cells.slice(0, below + 1), empty, ...cells.slice(below + 1)] };
}

/** The last one that is left is emptied. */
export function removeRow({ heading, cells }: TypedRows, row: number): TypedRows {
  const left = cells.filter((_, k) => k !== row);
  return { heading, cells: left.length > 0 ? left : [cells[0].map(() => '')] };
}

/** Lines of a spreadsheet set over the cells from one on; rows beyond the last are added, columns beyond it left out. */
export function pasteCells(
  { heading, cells }: TypedRows,
  row: number,
  column: number,
  text: string,
): TypedRows {
  const pasted = text
    .replace(/\r?\n$/, '')
    .split(/\r?\n/)
    .map((line) => line.split('\t'));
  const columns = cells[0].length;
  const count = Math.max(cells.length, row + pasted.length);
  return {
    heading,
    cells: Array.from({ length: count }, (_, k) =>
      Array.from(
        { length: columns },
        (__, c) => pasted[k - row]?.[c - column] ?? cells[k]?.[c] ?? '',
      ),
    ),
  };
}

const filled = (cells: string[], columns: number): string[] =>
  Array.from({ length: columns }, (_, c) => (cells[c] ?? '').trim());
