import type { SectionInput } from '../../shared/case/caseFile';

/** Elevation of the ground at the bank marks of a section, or at its ends where it has no marks, m. */
export function bankLevels(section: SectionInput): { left: number; right: number } {
  const { points, banks } = section;
  const [from, to] = banks ?? [points[0][0], points[points.length - 1][0]];
  return { left: groundAt(points, from), right: groundAt(points, to) };
}

/** At a vertical wall the top counts. */
function groundAt(points: SectionInput['points'], offset: number): number {
  let level = -Infinity;
  for (let k = 0; k < points.length; k++) {
    const [x, z] = points[k];
    if (x === offset) level = Math.max(level, z);
    const next = points[k + 1];
    if (next && x < offset && offset < next[0]) {
      level = z + ((next[1] - z) * (offset - x)) / (next[0] - x);
    }
  }
  return level;
}
