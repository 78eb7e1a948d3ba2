import { counted, type ChecklistRule } from './types';

export const dryCells: ChecklistRule = ({ sections, places }) => {
  const never = places.peakDepth.filter((depth, k) => places.section[k] < 0 && !(depth > 0)).length;
  const fell = sections.filter(({ fellDry }) => fellDry);
  const again = sections.filter(({ rewetted }) => rewetted);
  const none = never === 0 && fell.length === 0;
  return {
    id: 'dryCells',
    title: 'Dry and re-wetted places',
    outcome: none ? 'good' : 'look',
    finding: none
      ? 'No cell stayed dry, and no surveyed section fell dry.'
      : `${counted(never, 'cell')} never wet; ${counted(fell.length, 'surveyed section')} fell dry, ` +
        `${again.length} of them wet again${again.length > 0 ? ` (${again.map(({ id }) => id).join(', ')})` : ''}.`,
    rule: 'Where the bed falls dry and wets again, levels and arrival hang on the dry depth: look at those places (common practice).',
  };
};
