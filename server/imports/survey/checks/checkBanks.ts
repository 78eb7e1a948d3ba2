import { bankMarksOf, bankSide } from '../bankMarks';
import type { FaultList } from '../FaultList';
import { isNumber, type RawSection } from '../rawTypes';

const TWO = 'Mark two points of a section, L at the left bank and R at the right, or none.';

/** None or two marks, the left one on the left. */
export function checkBanks(section: RawSection, faults: FaultList) {
  const field = section.fields.get('bank');
  if (!field) return;
  const marks = bankMarksOf(section);
  if (marks.length === 0) return;
  const at = (index: number) => ({
    sheet: section.sheet,
    row: section.points[index].row,
    column: field.column,
  });
  if (marks.length > 2) {
    faults.fault(at(marks[2].index), `Section ${section.id} has ${marks.length} bank marks`, TWO);
    return;
  }
  if (marks.length === 1) {
    const missing = { left: 'Right bank', right: 'Left bank', unnamed: 'One bank' }[marks[0].side];
    faults.fault(at(marks[0].index), `${missing} is not marked`, `Section ${section.id}. ${TWO}`);
    return;
  }
  const [first, second] = marks;
  if (first.side === second.side || first.side === 'unnamed' || second.side === 'unnamed') {
    faults.fault(
      at(second.index),
      'Bank marks do not tell left from right',
      `Section ${section.id}. ${TWO}`,
    );
    return;
  }
  if (first.side === 'right')
    faults.fault(
      at(first.index),
      'Bank marks are swapped',
      `Section ${section.id}. The right bank stands before the left. Points run from left bank to right, looking downstream.`,
    );
  const [a, b] = [section.points[first.index].offset, section.points[second.index].offset];
  if (isNumber(a) && isNumber(b) && a === b)
    faults.fault(
      at(second.index),
      'Both banks stand at one offset',
      `Section ${section.id}. No channel is left between them.`,
    );
}

/** Marks that mean something else to the surveyor are named once a sheet. */
export function doubtOtherMarks(sections: RawSection[], faults: FaultList) {
  const bySheet = new Map<string, { marks: Set<string>; row: number; column: number }>();
  for (const section of sections) {
    const field = section.fields.get('bank');
    if (!field) continue;
    for (const point of section.points) {
      if (!point.bank || bankSide(point.bank)) continue;
      const seen = bySheet.get(section.sheet);
      if (seen) seen.marks.add(point.bank);
      else
        bySheet.set(section.sheet, {
          marks: new Set([point.bank]),
          row: point.row,
          column: field.column,
        });
    }
  }
  for (const [sheet, { marks, row, column }] of bySheet) {
    const some = [...marks].slice(0, 5).map((mark) => mark.slice(0, 20));
    const rest = marks.size > some.length ? ` and ${marks.size - some.length} more` : '';
    faults.doubt(
      { sheet, row, column },
      'Marks that are no bank marks',
      `${some.join(', ')}${rest} are passed over. L and R, or left and right, mark the banks.`,
    );
  }
}
