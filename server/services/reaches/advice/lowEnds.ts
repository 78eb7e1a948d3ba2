import type { AdviceRule } from './types';

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
      ({ side, end, bank }) => `${side} end ${end.toFixed(2)} m, bank ${bank.toFixed(2)} m`,
    );
    return [
      {
        code: 'lowEnds' as const,
        sectionIds: [id],
        chainage,
        message: `${id} ends below its bank: ${told.join('; ')}.`,
        reason:
          'Above its ends a section has walls, so water that would spread further stands too high here. Extend the section to higher ground.',
        source: 'Common practice',
      },
    ];
  });
