import type { AdviceRule } from './types';
import { partsOf, q, say, sayAll } from '../../../../shared/units/message';

/** Ends below the bank beside them: the flood would stand against a wall that is not there. */
export const adviseLowEnds: AdviceRule = (sections) =>
  sections.flatMap(({ id, chainage, points, banks, leftBank, rightBank }) => {
    if (!banks) return [];
    const low = [
      { side: 'left', end: points[0][1], bank: leftBank },
      { side: 'right', end: points[points.length - 1][1], bank: rightBank },
    ].filter(({ end, bank }) => end < bank);
    if (low.length === 0) return [];
    const told = low.map(
      ({ side, end, bank }) =>
        say`${side} end ${q(end, 'elevation')}, bank ${q(bank, 'elevation')}`,
    );
    return [
      {
        code: 'lowEnds' as const,
        sectionIds: [id],
        chainage,
        ...say`${id} ends below its bank: ${partsOf(sayAll(told, '; '))}.`,
        reason:
          'Above its ends a section has walls, so water that would spread further stands too high here. Extend the section to higher ground.',
        source: 'Common practice',
      },
    ];
  });
