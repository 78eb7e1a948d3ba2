import { q, say } from '../../../../shared/units/message';
import type { ChecklistRule } from './types';

/** Each section stands for half of the way to its neighbours. */
export const supercritical: ChecklistRule = ({ sections }) => {
  const fast = sections.flatMap((section, k) =>
    section.peakFroude > 1
      ? [{ section, length: halfWay(sections, k, -1) + halfWay(sections, k, 1) }]
      : [],
  );
  const length = fast.reduce((sum, part) => sum + part.length, 0);
  const highest = Math.max(0, ...sections.map(({ peakFroude }) => peakFroude));
  return {
    id: 'supercritical',
    title: 'Supercritical length',
    outcome: fast.length === 0 ? 'good' : 'look',
    finding:
      fast.length === 0
        ? `Subcritical at every surveyed section throughout; the highest Froude number is ${highest.toFixed(2)}.`
        : say`Supercritical at some time at ${fast.map(({ section }) => section.id).join(', ')}, about ${q(length, 'chainage')} of the reach; the highest Froude number is ${highest.toFixed(2)}.`,
    rule: 'Where Froude passes 1, look at the bed, the roughness and the spacing of sections there (common practice).',
  };
};

const halfWay = (sections: { chainage: number }[], k: number, step: -1 | 1): number => {
  const next = sections[k + step];
  return next ? Math.abs(next.chainage - sections[k].chainage) / 2 : 0;
};
