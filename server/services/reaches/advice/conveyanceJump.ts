import { between, pairs, type AdviceRule } from './types';

/** Bounds of K upstream over K downstream. Davidian (1984); numbers quoted from memory. */
const RATIO = { min: 0.7, max: 1.4 };
const SOURCE =
  'Davidian (1984), Computation of water-surface profiles in open channels, USGS TWRI 3-A15';

export const adviseConveyanceJump: AdviceRule = (sections) =>
  pairs(sections).flatMap(([above, below]) => {
    const ratio = above.bankfull.conveyance / below.bankfull.conveyance;
    if (!(ratio > 0) || !Number.isFinite(ratio)) return [];
    if (ratio >= RATIO.min && ratio <= RATIO.max) return [];
    const change = ratio < 1 ? 'grows' : 'falls';
    const factor = ratio < 1 ? 1 / ratio : ratio;
    return [
      {
        code: 'conveyanceJump',
        sectionIds: [above.id, below.id],
        chainage: between(above, below),
        message: `Bank-full conveyance ${change} ${factor.toFixed(1)} times from ${above.id} to ${below.id}.`,
        reason: `Its ratio, ${ratio.toFixed(2)}, lies outside of ${RATIO.min} to ${RATIO.max}: the friction slope changes so fast that its mean between the two is poor. A section between them would help.`,
        source: SOURCE,
      },
    ];
  });
