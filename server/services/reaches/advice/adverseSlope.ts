import { between, pairs, type AdviceRule } from './types';
import { q, say } from '../../../../shared/units/message';

/** Pools and riffles rise a little; more than this (m), and than this share of bank-full depth, wants a look. */
const RISE_M = 0.1;
const RISE_SHARE = 0.1;

export const adviseAdverseSlope: AdviceRule = (sections) =>
  pairs(sections).flatMap(([above, below]) => {
    const rise = below.thalweg - above.thalweg;
    const depth = Math.min(above.bankfull.depth, below.bankfull.depth);
    if (rise <= Math.max(RISE_M, RISE_SHARE * depth)) return [];
    return [
      {
        code: 'adverseSlope',
        sectionIds: [above.id, below.id],
        chainage: between(above, below),
        ...say`The bed rises ${q(rise, 'depth')} from ${above.id} to ${below.id}.`,
        reason:
          'A pool does that, and so does a slip of the survey: a wrong datum, a missed thalweg, sections in the wrong order. Pools hold water at low flow.',
        source: 'Common practice',
      },
    ];
  });
