import type { Section } from '../../surveys/types';
import { coordinateAt } from './coordinateAt';

/**
 * The section with other points. Coordinates are taken from the section's own line; roughness reaches to the new ends.
 * Banks, storage and embankments stay where they are: what no longer fits is a fault for `checkGeometry` to name.
 */
export function withPoints(section: Section, points: Section['points']): Section {
  const first = points[0]?.[0];
  const last = points[points.length - 1]?.[0];
  return {
    ...section,
    points,
    coordinates: placed(section, points),
    roughness: section.roughness
      .filter(([from], i) => i === 0 || from < last)
      .map(([from, n], i) => (i === 0 && from > first ? [first, n] : [from, n])),
  };
}

function placed(section: Section, points: Section['points']): Section['coordinates'] {
  const places = points.map(([offset], i) => {
    // A point that stands where it stood keeps its own coordinate to the last digit.
    const same = section.points[i]?.[0] === offset;
    return (same && section.coordinates?.[i]) || coordinateAt(section, offset);
  });
  return places.every((place) => place !== null) && places.length > 0 ? places : null;
}
