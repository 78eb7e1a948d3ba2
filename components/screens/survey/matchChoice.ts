import type {
  ColumnMatch,
  LengthUnit,
  MatchChoice,
  SheetMatch,
  SurveyField,
} from '@/shared/surveys/types';

export const FIELD_NAMES: Record<SurveyField, string> = {
  section: 'Section name',
  chainage: 'Chainage',
  offset: 'Offset',
  elevation: 'Elevation',
  roughness: "Manning's n",
  bank: 'Bank mark',
  easting: 'Easting',
  northing: 'Northing',
};

export const UNIT_NAMES: Record<LengthUnit, string> = {
  m: 'metres',
  km: 'kilometres',
  ft: 'feet',
  usft: 'US survey feet',
};

const LENGTHS: readonly SurveyField[] = ['chainage', 'offset', 'elevation', 'easting', 'northing'];

/** Whether a column of this meaning carries a unit of length. */
export const isLength = (field: SurveyField | null): boolean =>
  field !== null && LENGTHS.includes(field);

/** A heading, or the place of a column that has none. */
export const headingOf = ({ column, heading }: Pick<ColumnMatch, 'column' | 'heading'>): string =>
  heading || `Column ${column + 1}`;

/** Sheets whose headings stand alike: the person matches them once. */
export interface SheetGroup {
  key: string;
  layout: SheetMatch['layout'];
  sheets: string[];
  headingRow: number;
  columns: ColumnMatch[];
}

/**
 * Sheets that carry the survey, those with the same headings together, in the order of the workbook. Where no sheet could be
 * taken for a survey, all that have headings: the person says what their columns mean.
 */
export function groupSheets(sheets: readonly SheetMatch[]): SheetGroup[] {
  const groups = new Map<string, SheetGroup>();
  for (const { sheet, layout, headingRow, columns } of matchable(sheets)) {
    const key = `${layout}:${columns.map(({ column, heading }) => `${column}=${heading}`).join('|')}`;
    const group = groups.get(key);
    if (group) group.sheets.push(sheet);
    else groups.set(key, { key, layout, sheets: [sheet], headingRow, columns });
  }
  return [...groups.values()];
}

/** Names of the sheets that are not among the groups. */
export function passedOver(sheets: readonly SheetMatch[]): string[] {
  const used = matchable(sheets);
  return sheets.filter((sheet) => !used.includes(sheet)).map(({ sheet }) => sheet);
}

function matchable(sheets: readonly SheetMatch[]): SheetMatch[] {
  const used = sheets.filter(({ layout }) => layout !== 'ignored');
  return used.length > 0 ? used : sheets.filter(({ columns }) => columns.length > 0);
}

/** The match as it was read, as a choice that the person can change. */
export function choiceOf(
  sheets: readonly SheetMatch[],
  decimal: MatchChoice['decimal'],
): MatchChoice {
  const columns = new Map<number, MatchChoice['columns'][number]>();
  for (const sheet of matchable(sheets))
    for (const { column, field, unit } of sheet.columns)
      if (!columns.has(column)) columns.set(column, { column, field, unit });
  return { columns: [...columns.values()].sort((a, b) => a.column - b.column), decimal };
}

/**
 * Gives a column another meaning. A meaning belongs to one column: whichever had it before is passed over.
 * A length keeps its unit, or takes the one of another length in the file, or metres.
 */
export function chooseField(
  choice: MatchChoice,
  column: number,
  field: SurveyField | null,
): MatchChoice {
  const fallback = choice.columns.find(({ unit }) => unit !== null)?.unit ?? 'm';
  return {
    ...choice,
    columns: choice.columns.map((entry) => {
      if (entry.column === column)
        return { column, field, unit: isLength(field) ? (entry.unit ?? fallback) : null };
      return field !== null && entry.field === field
        ? { ...entry, field: null, unit: null }
        : entry;
    }),
  };
}

export const chooseUnit = (choice: MatchChoice, column: number, unit: LengthUnit): MatchChoice => ({
  ...choice,
  columns: choice.columns.map((entry) => (entry.column === column ? { ...entry, unit } : entry)),
});

/** Whether a needed column was not recognised, so that the person has to say which it is. */
export function isShort({ layout, columns }: Pick<SheetGroup, 'layout' | 'columns'>): boolean {
  const needed: SurveyField[] =
    layout === 'section' ? ['offset', 'elevation'] : ['section', 'chainage', 'offset', 'elevation'];
  return needed.some((field) => columns.every((column) => column.field !== field));
}
