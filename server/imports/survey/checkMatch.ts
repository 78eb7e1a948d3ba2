import type { SurveyField } from '../../../shared/surveys/types';
import { FIELD_NAMES } from '../headings/headingWords';
import { columnLetter } from '../workbook/columnLetter';
import type { FaultList } from './FaultList';
import type { MatchedSheet } from './matchSheet';

const CHOOSE = 'Choose under the columns what each one means, or mend the headings.';

/** Says of each sheet what its headings leave unclear. */
export function checkMatch(sheets: MatchedSheet[], faults: FaultList) {
  const used = sheets.filter(({ match }) => match.layout !== 'ignored');
  if (used.length === 0) return sayNothingFound(sheets, faults);
  for (const sheet of sheets) {
    if (sheet.match.layout === 'ignored') doubtPassedOver(sheet, faults);
    else checkUsed(sheet, faults);
  }
}

function checkUsed(sheet: MatchedSheet, faults: FaultList) {
  const { match, fields } = sheet;
  const row = match.headingRow - 1;
  for (const [field, columns] of sheet.claimedTwice)
    faults.fault(
      { sheet: match.sheet, row, column: columns[1] },
      `Two columns read as ${FIELD_NAMES[field]}`,
      `Columns ${columns.map(columnLetter).join(' and ')}. ${CHOOSE}`,
    );
  for (const { column, unit } of sheet.foreignUnits)
    faults.fault(
      { sheet: match.sheet, row, column },
      `Unit ${unit} is not read`,
      `Column ${columnLetter(column)}. Lengths are taken in m, km, ft or US survey ft.`,
    );
  if (match.layout === 'longTable' && !fields.has('chainage'))
    faults.fault(
      { sheet: match.sheet, row },
      'No column for the chainage',
      `${foundHeadings(sheet)} ${CHOOSE}`,
    );
  if (fields.has('easting') !== fields.has('northing')) {
    const missing = fields.has('easting') ? 'northing' : 'easting';
    faults.doubt(
      { sheet: match.sheet, row },
      `No column for the ${missing}`,
      'One coordinate alone places nothing; it is passed over.',
    );
  }
}

function doubtPassedOver(sheet: MatchedSheet, faults: FaultList) {
  const { match, grid } = sheet;
  if (grid.hidden)
    faults.doubt(
      { sheet: match.sheet },
      'The sheet is hidden',
      'It was passed over. Show it in the workbook if it belongs to the survey.',
    );
  else if (match.columns.length > 0)
    faults.doubt(
      { sheet: match.sheet },
      'The sheet was passed over',
      `It has ${missingFields(sheet)}. ${foundHeadings(sheet)}`,
    );
}

function sayNothingFound(sheets: MatchedSheet[], faults: FaultList) {
  const tables = sheets.filter(({ match }) => match.columns.length > 0);
  if (tables.length === 0) {
    const hidden = sheets.some(({ grid }) => grid.hidden);
    faults.fault(
      { sheet: sheets[0]?.match.sheet ?? '' },
      'No table was found',
      `${hidden ? 'Hidden sheets are not read. ' : ''}A survey is a table with a heading row and columns for section, chainage, offset and elevation.`,
    );
  }
  for (const sheet of tables) {
    const { match } = sheet;
    if (match.headingRow === 0)
      faults.fault({ sheet: match.sheet }, 'The columns have no headings', CHOOSE);
    else
      faults.fault(
        { sheet: match.sheet, row: match.headingRow - 1 },
        `There is ${missingFields(sheet)}`,
        `${foundHeadings(sheet)} ${CHOOSE}`,
      );
  }
}

function missingFields(sheet: MatchedSheet): string {
  const missing = (['offset', 'elevation'] satisfies SurveyField[]).filter(
    (field) => !sheet.fields.has(field),
  );
  return `no column for the ${missing.join(' and the ')}`;
}

function foundHeadings(sheet: MatchedSheet): string {
  const names = sheet.match.columns.map(({ heading }) => heading).filter(Boolean);
  if (names.length === 0) return '';
  return `Headings read: ${names
    .slice(0, 8)
    .map((name) => name.slice(0, 30))
    .join(', ')}.`;
}
