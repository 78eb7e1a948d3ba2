import { between, pairs, type AdviceRule } from './types';
import { q, say } from '../../../../shared/units/message';

/** Share of D/S, and channel widths, that two sections may lie apart. Samuels (1989, 1990); numbers quoted from memory. */
const DEPTH_RULE = 0.15;
const WIDTHS = 20;
/** On steeper reaches the rule of depth over slope asks for sections every few metres; it was made for rivers in subcritical flow. */
const STEEP = 0.005;
const SOURCE =
  'Samuels (1989), Backwater lengths in rivers, Proc. ICE Part 2, 87; Samuels (1990), Cross-section location in 1-D models';

/** Sections far enough apart that what lies between is guessed. */
export const adviseSpacing: AdviceRule = (sections) => {
  const [first, last] = [sections[0], sections[sections.length - 1]];
  const slope = (first.thalweg - last.thalweg) / (last.chainage - first.chainage);
  return pairs(sections).flatMap(([above, below]) => {
    const distance = below.chainage - above.chainage;
    const depth = 0.5 * (above.bankfull.depth + below.bankfull.depth);
    const width = 0.5 * (above.bankfull.topWidth + below.bankfull.topWidth);
    const byDepth = slope > 0 && slope <= STEEP ? (DEPTH_RULE * depth) / slope : Infinity;
    const byWidth = WIDTHS * width;
    const most = Math.min(byDepth, byWidth);
    if (!(distance > most)) return [];
    const reason =
      byDepth <= byWidth
        ? say`0.15 of bank-full depth over slope: 0.15 × ${q(depth, 'depth', { decimals: 1 })} ÷ ${slope.toFixed(5)} = ${q(most, 'length', { decimals: 0 })}. Backwater is lost between sections that lie further apart.`
        : say`20 bank-full widths of ${q(width, 'length', { decimals: 0 })} are ${q(most, 'length', { decimals: 0 })}. Storage and bends between sections further apart are guessed.`;
    return [
      {
        code: 'spacing',
        sectionIds: [above.id, below.id],
        chainage: between(above, below),
        ...say`${above.id} and ${below.id} lie ${q(distance, 'length', { decimals: 0 })} apart; ${q(most, 'length', { decimals: 0 })} or less is advised.`,
        reason: reason.message,
        reasonParts: reason.parts,
        source: SOURCE,
      },
    ];
  });
};
