import { q, say } from '../../../../shared/units/message';
import type { ChecklistRule } from './types';

export const sectionEnds: ChecklistRule = ({ sections }) => {
  const over = sections.filter(({ peakStage, lowerEnd }) => peakStage > lowerEnd);
  const most = over.reduce(
    (high, { peakStage, lowerEnd }) => Math.max(high, peakStage - lowerEnd),
    0,
  );
  return {
    id: 'sectionEnds',
    title: 'Water above the ends of sections',
    outcome: over.length === 0 ? 'good' : 'bad',
    finding:
      over.length === 0
        ? 'Every peak stays below the lower end of its section.'
        : say`Above the lower end at ${over.map(({ id }) => id).join(', ')}, by up to ${q(most, 'depth')}: walls stand there that are not in the field.`,
    rule: 'Sections reach above the highest water (common practice).',
  };
};
