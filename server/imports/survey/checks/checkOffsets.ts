import { showAlike } from '../../numbers/showNumber';
import type { FaultList } from '../FaultList';
import { isNumber, type RawSection } from '../rawTypes';

/** Offsets never go back; a section that runs backwards throughout is told once. Points are never sorted behind one's back. */
export function checkOffsets(section: RawSection, faults: FaultList) {
  const { column } = section.fields.get('offset')!;
  const known = section.points.filter((point) => isNumber(point.offset));
  const offsets = known.map((point) => point.offset as number);
  let back = 0;
  let forth = 0;
  for (let i = 1; i < offsets.length; i++) {
    if (offsets[i] < offsets[i - 1]) back++;
    if (offsets[i] > offsets[i - 1]) forth++;
  }
  if (back > 1 && forth === 0) {
    faults.fault(
      { sheet: section.sheet, row: section.firstRow, lastRow: section.lastRow, column },
      'Offsets run backwards',
      `Section ${section.id}. Points run from left bank to right, looking downstream. Turn the order of its rows round.`,
    );
    return;
  }
  let highest = -Infinity;
  known.forEach((point, i) => {
    if (i > 0 && offsets[i] < highest && offsets[i] < offsets[i - 1]) {
      const [now, before] = showAlike(offsets[i], offsets[i - 1]);
      faults.fault(
        { sheet: section.sheet, row: point.row, column },
        `Offset goes back: ${now} after ${before}`,
        `Section ${section.id}. Points run from left bank to right, looking downstream.`,
      );
    }
    highest = Math.max(highest, offsets[i]);
  });
}
