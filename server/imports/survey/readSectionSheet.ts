import type { LengthUnit } from '../../../shared/surveys/types';
import { METRES_PER } from '../headings/lengthUnits';
import type { DecimalMark } from '../../../shared/numbers/decimalMark';
import { showNumber } from '../numbers/showNumber';
import type { FaultList } from './FaultList';
import { isSkipped, readPoint } from './groupSections';
import type { MatchedSheet } from './matchSheet';
import { isNumber, type RawSection } from './rawTypes';
import { readNumberCell } from './readCells';
import { sheetLabels } from './sheetLabels';

/** Reads a sheet that holds one section: its points from the table, its id and chainage from labels or the sheet's name. */
export function readSectionSheet(
  sheet: MatchedSheet,
  decimal: DecimalMark,
  defaultUnit: LengthUnit,
  sections: Map<string, RawSection>,
  faults: FaultList,
) {
  const { grid, fields } = sheet;
  const labels = sheetLabels(grid, sheet.match.headingRow - 1, decimal, defaultUnit);
  const rows = grid.rows.flatMap((cells, row) =>
    cells && row >= sheet.firstDataRow && !isSkipped(cells, sheet) ? [{ cells, row }] : [],
  );
  const chainage = columnChainage(sheet, rows, decimal) ?? labels.chainage;
  if (chainage === null)
    faults.fault(
      { sheet: grid.name },
      'Chainage is missing',
      `Section ${labels.id}. Write “Chainage” and its value in two cells above the table, or give the table a column of chainages.`,
    );
  const twin = sections.get(labels.id);
  if (twin)
    faults.fault(
      { sheet: grid.name },
      `Section ${labels.id} stands in two places`,
      `It stands in sheet ${twin.sheet} too. Give this section its own id.`,
    );
  const key = twin ? `${labels.id} in ${grid.name}` : labels.id;
  sections.set(key, {
    id: labels.id,
    sheet: grid.name,
    fields,
    firstRow: rows[0]?.row ?? sheet.firstDataRow,
    lastRow: rows.at(-1)?.row ?? sheet.firstDataRow,
    chainage,
    chainageText: chainage === null ? '' : showNumber(chainage / METRES_PER[defaultUnit]),
    points: rows.map(({ cells, row }) => readPoint(cells, row, sheet, decimal)),
  });
}

function columnChainage(
  sheet: MatchedSheet,
  rows: { cells: MatchedSheet['grid']['rows'][number] }[],
  decimal: DecimalMark,
): number | null {
  const place = sheet.fields.get('chainage');
  if (!place) return null;
  for (const { cells } of rows) {
    const value = readNumberCell(cells[place.column], decimal, place.unit);
    if (isNumber(value)) return value * METRES_PER[place.unit];
  }
  return null;
}
