import type { Section } from '../../surveys/types';
import { withPoints } from './withPoints';

/**
 * Rows of a table set over the points from a row on; rows beyond the last are added. `columns`: both, or the one that the
 * rows hold; a lone column never goes beyond the last point, for the other half of the point would be missing.
 */
export function pastePoints(
  section: Section,
  row: number,
  values: readonly (readonly number[])[],
  columns: 'both' | 'offset' | 'elevation',
): Section {
  const points = section.points.map(([y, z]): [number, number] => [y, z]);
  values.forEach((cells, i) => {
    const at = row + i;
    if (columns === 'both') points[at] = [cells[0], cells[1]];
    else if (at < points.length) points[at][columns === 'offset' ? 0 : 1] = cells[0];
  });
  return withPoints(section, points);
}
