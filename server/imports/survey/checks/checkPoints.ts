import { LIMITS } from '../../../../shared/limits';
import { METRES_PER, UNIT_SYMBOLS } from '../../headings/lengthUnits';
import { showAlike, showNumber } from '../../numbers/showNumber';
import type { FaultList } from '../FaultList';
import { isBad, isNumber, type RawPoint, type RawSection } from '../rawTypes';

/** Above every summit and below every shore of the world, with room for local datums. */
const MAX_ELEVATION_M = 12_000;
const MAX_OFFSET_M = 100_000;

/** Each point has an offset and an elevation that are numbers and can be. */
export function checkPoints(section: RawSection, faults: FaultList) {
  const offsetUnit = UNIT_SYMBOLS[section.fields.get('offset')!.unit];
  section.points.forEach((point, index) => {
    const where = isNumber(point.offset)
      ? `Section ${section.id}, offset ${showNumber(point.offset)} ${offsetUnit}.`
      : `Section ${section.id}.`;
    checkNumber(section, index, 'elevation', MAX_ELEVATION_M, where, faults);
    checkNumber(section, index, 'offset', MAX_OFFSET_M, `Section ${section.id}.`, faults);
  });
  if (section.points.length > LIMITS.upload.pointsPerSection)
    faults.fault(
      { sheet: section.sheet, row: section.firstRow, lastRow: section.lastRow },
      `Section ${section.id} has ${showNumber(section.points.length)} points`,
      `At most ${showNumber(LIMITS.upload.pointsPerSection)} are taken. Thin it out where the ground is straight.`,
    );
}

function checkNumber(
  section: RawSection,
  index: number,
  field: 'offset' | 'elevation',
  maxMetres: number,
  where: string,
  faults: FaultList,
) {
  const point = section.points[index];
  const cell = point[field];
  const { column, unit } = section.fields.get(field)!;
  const place = { sheet: section.sheet, row: point.row, column };
  const name = field === 'offset' ? 'Offset' : 'Elevation';
  if (cell === null)
    faults.fault(
      place,
      `${name} is missing`,
      `${where} ${neighbours(section.points, index, field)}`,
    );
  else if (isBad(cell))
    faults.fault(
      place,
      `${name} is not a number: ${cell.bad}`,
      `${where} ${neighbours(section.points, index, field)}`,
    );
  else if (Math.abs(cell) * METRES_PER[unit] > maxMetres) {
    faults.fault(
      place,
      `${name} ${showNumber(cell)} cannot be`,
      `${where} ${neighbours(section.points, index, field)} Is the unit ${UNIT_SYMBOLS[unit]} right?`,
    );
    // Said once; what compares elevations with each other passes it over.
    point[field] = { bad: showNumber(cell) };
  }
}

/** What stands before and after, as a help to mend the cell. */
function neighbours(points: RawPoint[], index: number, field: 'offset' | 'elevation'): string {
  const values = [points[index - 1]?.[field], points[index + 1]?.[field]].filter(
    (value) => typeof value === 'number',
  );
  if (values.length === 2) return `Neighbours read ${showAlike(...values).join(' and ')}.`;
  if (values.length === 1) return `Its neighbour reads ${showNumber(values[0])}.`;
  return `Write a number.`;
}
