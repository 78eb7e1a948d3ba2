import { METRES_PER } from '../headings/lengthUnits';
import type { DecimalMark } from '../../../shared/numbers/decimalMark';
import { showNumber } from '../numbers/showNumber';
import { cellText } from '../workbook/cellText';
import type { Cell } from '../workbook/types';
import type { FaultList } from './FaultList';
import type { MatchedSheet } from './matchSheet';
import { isBad, isNumber, type NumberCell, type RawPoint, type RawSection } from './rawTypes';
import { readNumberCell } from './readCells';

type Row = (Cell | undefined)[];

/**
 * Reads the rows of one long table into sections. A blank section or chainage means the one above, as it does in merged cells
 * and in tables that name a section once. `sections` is shared by all sheets, so that a section torn apart is found.
 */
export function groupSections(
  sheet: MatchedSheet,
  decimal: DecimalMark,
  sections: Map<string, RawSection>,
  faults: FaultList,
) {
  const { grid, fields } = sheet;
  const torn = new Set<string>();
  let current: RawSection | null = null;
  let nameless: number[] = [];
  const sayNameless = () => {
    if (nameless.length > 0)
      faults.fault(
        {
          sheet: grid.name,
          row: nameless[0],
          lastRow: nameless.at(-1),
          column: fields.get('section')?.column,
        },
        'Section is missing',
        'These points belong to no section. Write its id in each row, or in the first one.',
      );
    nameless = [];
  };

  for (let row = sheet.firstDataRow; row < grid.rows.length; row++) {
    const cells = grid.rows[row];
    if (!cells || isSkipped(cells, sheet)) continue;
    const chainage = readField(cells, sheet, 'chainage', decimal);
    const key = keyOf(cells, sheet, chainage, current);
    if (key === null) {
      nameless.push(row);
      current = null;
      continue;
    }
    sayNameless();
    if (!current || key !== current.id) {
      const known = sections.get(key);
      if (known && !torn.has(key)) {
        torn.add(key);
        faults.fault(
          { sheet: grid.name, row, column: fields.get('section')?.column },
          `Section ${key} stands in two places`,
          `It began in row ${known.firstRow + 1}${known.sheet === grid.name ? '' : ` of sheet ${known.sheet}`} and ended in row ${known.lastRow + 1}. Put its rows together, or give this section its own id.`,
        );
      }
      current = known ?? startSection(sheet, key, row, chainage, faults);
      sections.set(key, current);
    } else checkSameChainage(current, row, chainage, sheet, faults);
    if (!torn.has(key)) current.lastRow = row;
    current.points.push(readPoint(cells, row, sheet, decimal));
  }
  sayNameless();
}

export function readPoint(
  cells: Row,
  row: number,
  sheet: MatchedSheet,
  decimal: DecimalMark,
): RawPoint {
  const bank = sheet.fields.get('bank');
  return {
    row,
    offset: readField(cells, sheet, 'offset', decimal),
    elevation: readField(cells, sheet, 'elevation', decimal),
    roughness: readField(cells, sheet, 'roughness', decimal),
    easting: readField(cells, sheet, 'easting', decimal),
    northing: readField(cells, sheet, 'northing', decimal),
    bank: bank ? cellText(cells[bank.column]) : '',
  };
}

function readField(
  cells: Row,
  sheet: MatchedSheet,
  field: 'chainage' | 'offset' | 'elevation' | 'roughness' | 'easting' | 'northing',
  decimal: DecimalMark,
): NumberCell {
  const place = sheet.fields.get(field);
  if (!place) return null;
  return readNumberCell(cells[place.column], decimal, field === 'roughness' ? null : place.unit);
}

/** Blank rows, rows with nothing in any column that means something, and headings repeated on each printed page. */
export function isSkipped(cells: Row, sheet: MatchedSheet): boolean {
  const places = [...sheet.fields.values()];
  if (places.every(({ column }) => !cells[column])) return true;
  const headings = new Map(sheet.match.columns.map(({ column, heading }) => [column, heading]));
  return places.every(
    ({ column }) =>
      cells[column]?.kind === 'text' && cellText(cells[column]) === headings.get(column),
  );
}

/** The section that a row belongs to; null: none is named. */
function keyOf(
  cells: Row,
  sheet: MatchedSheet,
  chainage: NumberCell,
  current: RawSection | null,
): string | null {
  const place = sheet.fields.get('section');
  if (!place) {
    if (chainage === null || isBad(chainage)) return current?.id ?? null;
    return showNumber(chainage).replaceAll(',', '');
  }
  const id = cellText(cells[place.column]);
  if (id) return id;
  const metres = metresOf(chainage, sheet);
  const sameChainage = metres === null || current?.chainage == null || metres === current.chainage;
  return current && sameChainage ? current.id : null;
}

function startSection(
  sheet: MatchedSheet,
  id: string,
  row: number,
  chainage: NumberCell,
  faults: FaultList,
): RawSection {
  const { grid, fields } = sheet;
  const column = fields.get('chainage')?.column;
  if (column !== undefined && chainage === null)
    faults.fault(
      { sheet: grid.name, row, column },
      'Chainage is missing',
      `Section ${id}. Write its distance along the reach, growing downstream.`,
    );
  if (isBad(chainage))
    faults.fault(
      { sheet: grid.name, row, column },
      `Chainage is not a number: ${chainage.bad}`,
      `Section ${id}. Write its distance along the reach, growing downstream.`,
    );
  return {
    id,
    sheet: grid.name,
    fields,
    firstRow: row,
    lastRow: row,
    chainage: metresOf(chainage, sheet),
    chainageText: isNumber(chainage) ? showNumber(chainage) : '',
    points: [],
  };
}

/** Told once a section: the rest of its rows would repeat it. */
function checkSameChainage(
  section: RawSection,
  row: number,
  chainage: NumberCell,
  sheet: MatchedSheet,
  faults: FaultList,
) {
  const place = sheet.fields.get('chainage');
  const metres = metresOf(chainage, sheet);
  if (!place || section.chainage === null) return;
  const column = place.column;
  if (isBad(chainage))
    faults.fault(
      { sheet: sheet.grid.name, row, column },
      `Chainage is not a number: ${chainage.bad}`,
      `Section ${section.id} stands at ${section.chainageText}.`,
    );
  else if (metres !== null && metres !== section.chainage && isNumber(chainage))
    faults.fault(
      { sheet: sheet.grid.name, row, column },
      `Chainage changes within a section: ${showNumber(chainage)} after ${section.chainageText}`,
      `Section ${section.id}. All points of a section stand at one chainage.`,
    );
  else return;
  // What is doubtful is not compared again, nor with other sections.
  section.chainage = null;
}

function metresOf(chainage: NumberCell, sheet: MatchedSheet): number | null {
  const place = sheet.fields.get('chainage');
  if (!place || !isNumber(chainage)) return null;
  return chainage * METRES_PER[place.unit];
}
