import type { RawSection } from './rawTypes';

export type BankSide = 'left' | 'right' | 'unnamed';

const SIDES = new Map<string, BankSide>([
  ...side(
    'left',
    'l lb left leftbank bankleft tl ltb lub lu links linkesufer linkes rg rivegauche gauche mi margenizquierda izquierda izq i',
  ),
  ...side(
    'right',
    'r rb right rightbank bankright tr rtb rub ru rechts rechtesufer rechtes rd rivedroite droite md margenderecha derecha der d',
  ),
  ...side('unnamed', 'x b bank bk ufer berge rive orilla 1 topofbank top'),
]);

function side(name: BankSide, words: string): [string, BankSide][] {
  return words.split(' ').map((word) => [word, name]);
}

/** Which bank a mark means, in the spellings of the trade (common practice); null: none. */
export const bankSide = (mark: string): BankSide | null =>
  SIDES.get(
    mark
      .normalize('NFKD')
      .toLowerCase()
      .replace(/[^a-z0-9]/g, ''),
  ) ?? null;

export interface MarkedBank {
  /** Index of the point. */
  index: number;
  side: BankSide;
}

/** Marks of a section in the order of its points; of two unnamed ones the first is the left. */
export function bankMarksOf(section: RawSection): MarkedBank[] {
  const marks = section.points.flatMap((point, index) => {
    const found = point.bank ? bankSide(point.bank) : null;
    return found ? [{ index, side: found }] : [];
  });
  if (marks.length === 2 && marks.every((mark) => mark.side === 'unnamed'))
    return [
      { ...marks[0], side: 'left' },
      { ...marks[1], side: 'right' },
    ];
  return marks;
}
