import type { FaultList } from '../FaultList';
import { isNumber, type RawSection } from '../rawTypes';

const MIN_POINTS = 3;
const MAX_ID = 100;

/** A section is at least three points with some width between them. */
export function checkShape(section: RawSection, faults: FaultList) {
  const rows = { sheet: section.sheet, row: section.firstRow, lastRow: section.lastRow };
  const count = section.points.length;
  if (count < MIN_POINTS)
    faults.fault(
      rows,
      `Section ${section.id} has ${count === 0 ? 'no points' : count === 1 ? 'one point' : 'two points'}`,
      `A section needs at least ${MIN_POINTS}: both banks and the bed.`,
    );
  const offsets = section.points.flatMap(({ offset }) => (isNumber(offset) ? offset : []));
  if (count >= MIN_POINTS && offsets.length === count && offsets.every((o) => o === offsets[0]))
    faults.fault(
      { ...rows, column: section.fields.get('offset')!.column },
      `Section ${section.id} has no width`,
      'All its points stand at one offset. Are the offsets in another column?',
    );
  if (section.id.length > MAX_ID)
    faults.fault(
      { sheet: section.sheet, row: section.firstRow },
      'Section id is too long',
      `${section.id.slice(0, 40)}… has more than ${MAX_ID} characters.`,
    );
  checkEndWalls(section, faults);
  for (let i = 1; i < count; i++) {
    const [before, now] = [section.points[i - 1], section.points[i]];
    const same = isNumber(now.offset) && isNumber(now.elevation);
    if (same && now.offset === before.offset && now.elevation === before.elevation)
      faults.doubt(
        { sheet: section.sheet, row: now.row },
        'Point stands twice',
        `Section ${section.id}. The row before has the same offset and elevation. It does no harm.`,
      );
  }
}

/** A wall at an end goes up outwards; one that goes the other way has no ground behind it. */
function checkEndWalls({ id, sheet, points }: RawSection, faults: FaultList) {
  const ends = [
    { name: 'left', end: points[0], inner: points[1] },
    { name: 'right', end: points[points.length - 1], inner: points[points.length - 2] },
  ];
  for (const { name, end, inner } of ends) {
    if (!inner || !isNumber(end.offset) || end.offset !== inner.offset) continue;
    if (isNumber(end.elevation) && isNumber(inner.elevation) && inner.elevation > end.elevation)
      faults.fault(
        { sheet, row: end.row },
        `The wall at the ${name} end falls outwards`,
        `Section ${id}. Begin or end the section at the top of the wall.`,
      );
  }
}
