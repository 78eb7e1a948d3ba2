import { SURVEY_FIELDS } from '../../../shared/surveys/types';
import type { Grid } from '../workbook/types';
import { isNumeric } from '../numbers/isNumeric';
import { matchHeadings, type HeadingMatch } from './matchHeadings';
import { unitOf } from './lengthUnits';

const ROWS_LOOKED_AT = 60;
const ALL_FIELDS = SURVEY_FIELDS.length;

export interface FoundHeadings {
  /** 0-based; -1 where the numbers begin without headings. */
  row: number;
  /** 0-based row of the first data. */
  firstDataRow: number;
  headings: HeadingMatch[];
}

/**
 * Looks for the row of headings below whatever titles stand above it: the row in which most columns are understood, or, where
 * none is, the texts right above the first numbers, so that a person can say what they mean. null: no table here.
 */
export function findHeadingRow(grid: Grid): FoundHeadings | null {
  let best: { row: number; headings: HeadingMatch[]; score: number } | null = null;
  for (let row = 0; row < Math.min(grid.rows.length, ROWS_LOOKED_AT); row++) {
    const headings = matchHeadings(texts(grid, row));
    const fields = new Set(headings.flatMap(({ field }) => field ?? []));
    const telling = Number(fields.has('elevation')) + Number(fields.has('offset'));
    // A row with both is a table's; a labelled cell above it, like `Section | X`, may look like one of them.
    const score = fields.size + (telling === 2 ? ALL_FIELDS : 0);
    if (telling > 0 && fields.size >= 2 && score > (best?.score ?? 0))
      best = { row, headings, score };
  }
  if (best) return withUnitRow(grid, best.row, best.headings);

  const firstNumbers = grid.rows.findIndex((_, row) => numericCells(grid, row) >= 2);
  if (firstNumbers < 0) return null;
  let above = firstNumbers - 1;
  while (above >= 0 && texts(grid, above).length === 0) above--;
  const headings = above >= 0 ? matchHeadings(texts(grid, above)) : [];
  if (headings.length >= 2) return withUnitRow(grid, above, headings);
  return { row: -1, firstDataRow: firstNumbers, headings: [] };
}

/** Columns that hold data, headed or not, in order. */
export function columnsOf(grid: Grid, found: FoundHeadings): HeadingMatch[] {
  const byColumn = new Map(found.headings.map((heading) => [heading.column, heading]));
  for (const row of grid.rows.slice(found.firstDataRow, found.firstDataRow + 20)) {
    row?.forEach((cell, column) => {
      if (cell && !byColumn.has(column))
        byColumn.set(column, {
          column,
          text: '',
          words: '',
          unit: null,
          foreignUnit: null,
          field: null,
        });
    });
  }
  return [...byColumn.values()].sort((a, b) => a.column - b.column);
}

/** Units may stand in a row of their own below the headings. */
function withUnitRow(grid: Grid, row: number, headings: HeadingMatch[]): FoundHeadings {
  const below = texts(grid, row + 1).map(({ column, text }) => ({
    column,
    unit: unitOf(text.replace(/[()[\]]/g, '')),
    blank: /^[([]?\s*[-–/]?\s*[)\]]?$/.test(text),
  }));
  const isUnits = below.some(({ unit }) => unit) && below.every(({ unit, blank }) => unit || blank);
  if (!isUnits || numericCells(grid, row + 1) > 0) return { row, firstDataRow: row + 1, headings };
  const units = new Map(below.map(({ column, unit }) => [column, unit]));
  return {
    row,
    firstDataRow: row + 2,
    headings: headings.map((heading) => ({
      ...heading,
      unit: heading.unit ?? units.get(heading.column) ?? null,
    })),
  };
}

const texts = (grid: Grid, row: number) =>
  (grid.rows[row] ?? []).flatMap((cell, column) =>
    cell?.kind === 'text' && !isNumeric(cell) ? [{ column, text: cell.text.trim() }] : [],
  );

const numericCells = (grid: Grid, row: number) =>
  (grid.rows[row] ?? []).filter((cell) => isNumeric(cell)).length;
