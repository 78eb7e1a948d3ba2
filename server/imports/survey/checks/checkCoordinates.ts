import type { FaultList } from '../FaultList';
import { isBad, isNumber, type RawSection } from '../rawTypes';

/** Coordinates stand at every point of a section, in pairs, or at none. */
export function checkCoordinates(section: RawSection, faults: FaultList) {
  const fields = (['easting', 'northing'] as const).flatMap((name) => {
    const field = section.fields.get(name);
    return field ? [{ name, column: field.column }] : [];
  });
  if (fields.length === 0) return;
  const given = section.points.some((point) => fields.some(({ name }) => point[name] !== null));
  if (!given) return;
  for (const point of section.points) {
    for (const { name, column } of fields) {
      const cell = point[name];
      if (isNumber(cell)) continue;
      const title = name === 'easting' ? 'Easting' : 'Northing';
      faults.fault(
        { sheet: section.sheet, row: point.row, column },
        isBad(cell) ? `${title} is not a number: ${cell.bad}` : `${title} is missing`,
        `Section ${section.id}. Give every point of a section both coordinates, or none.`,
      );
    }
  }
}
