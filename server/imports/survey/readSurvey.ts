import type { LengthUnit, MatchChoice, SurveyReading } from '../../../shared/surveys/types';
import { decimalMark, type DecimalMark } from '../../../shared/numbers/decimalMark';
import type { Workbook } from '../workbook/types';
import { readWorkbook } from '../workbook/readWorkbook';
import { checkBanks, doubtOtherMarks } from './checks/checkBanks';
import { checkCoordinates } from './checks/checkCoordinates';
import { checkElevations } from './checks/checkElevations';
import { checkOffsets } from './checks/checkOffsets';
import { checkPoints } from './checks/checkPoints';
import { checkReach } from './checks/checkReach';
import { checkRoughness } from './checks/checkRoughness';
import { checkShape } from './checks/checkShape';
import { checkMatch } from './checkMatch';
import { FaultList } from './FaultList';
import { groupSections } from './groupSections';
import { matchSheet, type MatchedSheet } from './matchSheet';
import type { RawSection } from './rawTypes';
import { readSectionSheet } from './readSectionSheet';
import { toSection } from './toSection';

export interface SurveyReadingOptions {
  fileName: string;
  choice: MatchChoice | null;
  /** Where neither a heading nor the person names a unit: that of the study. */
  defaultUnit: LengthUnit;
}

/**
 * Bytes of an XLSX or CSV to sections in SI, with everything that is wrong with them. Throws an ImportError only where there is
 * nothing to read. Run it off the main thread: see `readInWorker.ts`.
 */
export function readSurvey(bytes: Buffer, options: SurveyReadingOptions): SurveyReading {
  const { fileName, choice, defaultUnit } = options;
  const book = readWorkbook(bytes, fileName);
  const sheets = book.sheets.map((grid) => matchSheet(grid, choice, defaultUnit));
  const faults = new FaultList(book.sheets.map(({ name }) => name));
  checkMatch(sheets, faults);
  const decimal = chooseDecimal(book, sheets, choice, faults);

  const found = new Map<string, RawSection>();
  for (const sheet of sheets) {
    if (sheet.match.layout === 'longTable') groupSections(sheet, decimal, found, faults);
    if (sheet.match.layout === 'section')
      readSectionSheet(sheet, decimal, defaultUnit, found, faults);
    doubtHiddenRows(sheet, faults);
  }
  const sections = [...found.values()];
  if (sections.length === 0) sayNoPoints(sheets, faults);
  checkSections(sections, faults);

  const clean = !faults.refuses && sections.length > 0;
  return {
    fileName,
    sheets: sheets.map(({ match }) => match),
    decimal,
    sectionCount: sections.length,
    pointCount: sections.reduce((sum, { points }) => sum + points.length, 0),
    ...faults.list(),
    sections: clean ? sections.map(toSection).sort((a, b) => a.chainage - b.chainage) : [],
  };
}

function checkSections(sections: RawSection[], faults: FaultList) {
  for (const section of sections) {
    checkPoints(section, faults);
    checkShape(section, faults);
    checkOffsets(section, faults);
    checkElevations(section, faults);
    checkBanks(section, faults);
    checkRoughness(section, faults);
    checkCoordinates(section, faults);
  }
  doubtOtherMarks(sections, faults);
  if (sections.length > 0) checkReach(sections, faults);
}

function chooseDecimal(
  book: Workbook,
  sheets: MatchedSheet[],
  choice: MatchChoice | null,
  faults: FaultList,
): DecimalMark {
  if (choice && choice.decimal !== 'auto') return choice.decimal;
  const evidence = decimalMark(numberTexts(sheets), book.separator === ';' ? 'comma' : null);
  if (evidence.unclear)
    faults.fault(
      { sheet: sheets.find(({ fields }) => fields.size > 0)?.match.sheet ?? '' },
      `Does ${evidence.unclear} have decimals?`,
      'Nothing in the file tells whether its commas part thousands or decimals. Choose the decimal mark.',
    );
  return evidence.mark;
}

function* numberTexts(sheets: MatchedSheet[]): Generator<string> {
  for (const { grid, fields, firstDataRow } of sheets) {
    const columns = [...fields].flatMap(([field, { column }]) =>
      field === 'section' || field === 'bank' ? [] : column,
    );
    for (const row of grid.rows.slice(firstDataRow)) {
      for (const column of columns) {
        const cell = row?.[column];
        if (cell?.kind === 'text') yield cell.text;
      }
    }
  }
}

/** Headings alone: the blank template, sent as it is. */
function sayNoPoints(sheets: MatchedSheet[], faults: FaultList) {
  const table = sheets.find(({ match }) => match.layout !== 'ignored');
  if (table && !faults.refuses)
    faults.fault(
      { sheet: table.match.sheet },
      'The table has no points',
      'Below the headings nothing stands. Write one point a row.',
    );
}

function doubtHiddenRows({ grid, match, firstDataRow }: MatchedSheet, faults: FaultList) {
  const rows = grid.hiddenRows.filter((row) => row >= firstDataRow && grid.rows[row]);
  if (match.layout === 'ignored' || rows.length === 0) return;
  faults.doubt(
    { sheet: match.sheet, row: rows[0], lastRow: rows.at(-1) },
    `${rows.length === 1 ? 'A hidden row was' : `${rows.length} hidden rows were`} read`,
    'A filter or a fold hides them in the workbook. Delete them if they do not belong to the survey.',
  );
}
