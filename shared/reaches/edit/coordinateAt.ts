import type { Section } from '../../surveys/types';

/**
 * [easting, northing] of an offset on a section's own line, in its coordinate system: linear between its points, straight on
 * beyond its ends. null where the section has none.
 */
export function coordinateAt(
  { points, coordinates }: Pick<Section, 'points' | 'coordinates'>,
  offset: number,
): [number, number] | null {
  if (!coordinates || coordinates.length < 2) return null;
  const next = points.findIndex(([y]) => y > offset);
  const end = next < 0 ? points.length - 1 : next;
  const [from, to] = piece(points, end === 0 ? 1 : end);
  const [y0, y1] = [points[from][0], points[to][0]];
  const [[e0, n0], [e1, n1]] = [coordinates[from], coordinates[to]];
  if (y1 === y0) return [e0, n0];
  const share = (offset - y0) / (y1 - y0);
  return [e0 + share * (e1 - e0), n0 + share * (n1 - n0)];
}

/** The piece that ends at a point, grown over a wall until it has some width. */
function piece(points: Section['points'], end: number): [number, number] {
  let [from, to] = [end - 1, end];
  while (points[to][0] === points[from][0] && from > 0) from--;
  while (points[to][0] === points[from][0] && to < points.length - 1) to++;
  return [from, to];
}
