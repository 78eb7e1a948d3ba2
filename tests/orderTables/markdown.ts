import { orderBetween, type GridRow } from './gridRow';
import { SCHEMES } from './schemes';
import type { OrderTableCase } from './tables';

/** The section of one case: a row a grid, four columns a scheme. `results` in the order of SCHEMES. */
export function caseMarkdown(table: OrderTableCase, results: readonly GridRow[][]): string {
  const head = SCHEMES.flatMap(({ name }) => [
    `${name}: ${table.water}`,
    'order',
    'flow, m³/s',
    'order',
  ]);
  const rows = table.grids.map((cells, i) => [
    String(cells),
    ...results.flatMap((grid) =>
      ([0, 1] as const).flatMap((which) => {
        const order = i === 0 ? null : orderBetween(grid[i - 1], grid[i], which);
        return [grid[i].errors[which].toExponential(3), order === null ? '-' : order.toFixed(2)];
      }),
    ),
  ]);
  const line = (cells: readonly string[]) => `| ${cells.join(' | ')} |`;
  const all = ['cells', ...head];
  return [
    `## ${table.title} (\`${table.id}\`)`,
    '',
    table.source,
    '',
    line(all),
    line(all.map(() => '---:')),
    ...rows.map(line),
    '',
  ].join('\n');
}

/** Rows of a case in the file, for each scheme; throws where the case is not in it. */
export function readMarkdown(text: string, id: string): GridRow[][] {
  const section = text.split(/^## /m).find((part) => part.includes(`(\`${id}\`)`));
  if (!section) throw new Error(`no table of ${id}: run npm run order-tables`);
  const rows = section
    .split('\n')
    .filter((line) => /^\| *\d/.test(line))
    .map((line) =>
      line
        .split('|')
        .slice(1, -1)
        .map((cell) => cell.trim()),
    );
  return SCHEMES.map((_, s) =>
    rows.map((row) => ({
      cells: Number(row[0]),
      errors: [Number(row[1 + 4 * s]), Number(row[3 + 4 * s])],
    })),
  );
}
