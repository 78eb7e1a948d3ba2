import type { FaultList } from '../FaultList';
import { isNumber, type RawSection } from '../rawTypes';

const MIN_POINTS = 3;

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
