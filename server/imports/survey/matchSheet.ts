import type {
  ColumnMatch,
  LengthUnit,
  MatchChoice,
  SheetMatch,
  SurveyField,
} from '../../../shared/surveys/types';
import { columnsOf, findHeadingRow } from '../headings/findHeadingRow';
import { LENGTH_FIELDS } from '../headings/headingWords';
import type { HeadingMatch } from '../headings/matchHeadings';
import { cellText } from '../workbook/cellText';
import type { Grid } from '../workbook/types';

const SAMPLES = 3;

/** A field's column in a sheet and, for lengths, the unit it is written in. */
export interface FieldColumn {
  column: number;
  unit: LengthUnit;
}

export interface MatchedSheet {
  grid: Grid;
  match: SheetMatch;
  fields: Map<SurveyField, FieldColumn>;
  /** Fields that more than one heading claims, with the columns. */
  claimedTwice: Map<SurveyField, number[]>;
  /** Columns whose heading names a unit that is not read. */
  foreignUnits: { column: number; unit: string }[];
  /** 0-based. */
  firstDataRow: number;
}

/** Understands one sheet by its headings and by what the person chose. `defaultUnit` stands where no heading names one. */
export function matchSheet(
  grid: Grid,
  choice: MatchChoice | null,
  defaultUnit: LengthUnit,
): MatchedSheet {
  const found = grid.hidden ? null : findHeadingRow(grid);
  if (!found) return passedOver(grid);
  const headings = applyChoice(columnsOf(grid, found), choice);
  const unit = commonUnit(headings) ?? defaultUnit;
  const chosenUnits = new Map(choice?.columns.map(({ column, unit: own }) => [column, own]));

  const fields = new Map<SurveyField, FieldColumn>();
  const claimedTwice = new Map<SurveyField, number[]>();
  const foreignUnits: MatchedSheet['foreignUnits'] = [];
  const columns = headings.map((heading): ColumnMatch => {
    const { column, field } = heading;
    const isLength = field !== null && LENGTH_FIELDS.includes(field);
    const own = chosenUnits.get(column) ?? unitFor(heading, unit);
    if (field) {
      const first = fields.get(field);
      if (first) claimedTwice.set(field, [...(claimedTwice.get(field) ?? [first.column]), column]);
      else fields.set(field, { column, unit: own });
      if (isLength && heading.foreignUnit && !chosenUnits.get(column))
        foreignUnits.push({ column, unit: heading.foreignUnit });
    }
    return {
      column,
      heading: heading.text,
      field,
      unit: isLength ? own : null,
      sample: sample(grid, found.firstDataRow, column),
    };
  });
  const layout = layoutOf(grid, fields, found.firstDataRow);
  return {
    grid,
    match: { sheet: grid.name, layout, headingRow: found.row + 1, columns },
    fields,
    claimedTwice,
    foreignUnits,
    firstDataRow: found.firstDataRow,
  };
}

function passedOver(grid: Grid): MatchedSheet {
  return {
    grid,
    match: { sheet: grid.name, layout: 'ignored', headingRow: 0, columns: [] },
    fields: new Map(),
    claimedTwice: new Map(),
    foreignUnits: [],
    firstDataRow: 0,
  };
}

/** A chosen field leaves every other column that only its heading had put there. */
function applyChoice(headings: HeadingMatch[], choice: MatchChoice | null): HeadingMatch[] {
  const chosen = new Map(choice?.columns.map(({ column, field }) => [column, field]));
  const taken = new Set([...chosen.values()].filter((field) => field !== null));
  return headings.map((heading) => {
    const own = chosen.get(heading.column);
    if (own !== undefined) return { ...heading, field: own };
    return heading.field && taken.has(heading.field) ? { ...heading, field: null } : heading;
  });
}

/** Where some headings name feet and the others nothing, all are feet. Kilometres are of the chainage alone. */
function commonUnit(headings: HeadingMatch[]): LengthUnit | null {
  const named = new Set(headings.flatMap(({ field, unit }) => (field && unit ? unit : [])));
  named.delete('km');
  return named.size === 1 ? [...named][0] : null;
}

function unitFor(heading: HeadingMatch, common: LengthUnit): LengthUnit {
  if (heading.unit) return heading.unit;
  return /\bkm\b|kilomet/.test(heading.words) ? 'km' : common;
}

function layoutOf(
  grid: Grid,
  fields: Map<SurveyField, FieldColumn>,
  firstDataRow: number,
): SheetMatch['layout'] {
  if (!fields.has('offset') || !fields.has('elevation')) return 'ignored';
  if (fields.has('section')) return 'longTable';
  const chainage = fields.get('chainage');
  if (!chainage) return 'section';
  const values = new Set<string>();
  for (const row of grid.rows.slice(firstDataRow)) {
    const text = cellText(row?.[chainage.column]);
    if (text) values.add(text);
    if (values.size > 1) return 'longTable';
  }
  return 'section';
}

function sample(grid: Grid, firstDataRow: number, column: number): string[] {
  const texts: string[] = [];
  for (let row = firstDataRow; row < grid.rows.length && texts.length < SAMPLES; row++) {
    const text = cellText(grid.rows[row]?.[column]);
    if (text) texts.push(text.slice(0, 40));
  }
  return texts;
}
