import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';

export interface GridError {
  cells: number;
  error: number;
}

export interface OrderTable {
  /** Error on the finest grid. */
  finest: number;
  /** Order observed between the two finest grids. */
  order: number;
}

const FOLDER = path.join(process.cwd(), '.data-test', 'order-tables');

/** Measures `errorOn(cells)` on each grid, keeps the table as a file for people to read, and returns its last
 *  line: observed order log(e1/e2)/log(n2/n1) of the finest pair. */
export function orderTable(
  title: string,
  grids: readonly number[],
  errorOn: (cells: number) => number,
): OrderTable {
  const rows: GridError[] = grids.map((cells) => ({ cells, error: errorOn(cells) }));
  const orders = rows.map((row, i) =>
    i === 0
      ? NaN
      : Math.log(rows[i - 1].error / row.error) / Math.log(row.cells / rows[i - 1].cells),
  );
  const lines = rows.map(
    (row, i) =>
      `| ${row.cells} | ${row.error.toExponential(3)} | ${i === 0 ? '-' : orders[i].toFixed(2)} |`,
  );
  mkdirSync(FOLDER, { recursive: true });
  const name = title.replace(/[^a-z0-9]+/gi, '-').toLowerCase();
  writeFileSync(
    path.join(FOLDER, `${name}.md`),
    [`# ${title}`, '', '| cells | error | order |', '|---|---|---|', ...lines, ''].join('\n'),
  );
  return { finest: rows[rows.length - 1].error, order: orders[orders.length - 1] };
}
