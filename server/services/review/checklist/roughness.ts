import { ROUGHNESS_RANGE, ROUGHNESS_SOURCE } from '../../../../shared/reaches/roughnessTable';
import { counted, type ChecklistRule } from './types';

export const roughness: ChecklistRule = ({ caseFile }) => {
  const values = caseFile.sections.flatMap((section) => section.roughness.map(([, n]) => n));
  const { min, max } = ROUGHNESS_RANGE;
  const outside = values.filter((n) => n < min || n > max).length;
  const range = `Manning's n from ${Math.min(...values)} to ${Math.max(...values)}`;
  return {
    id: 'roughness',
    title: 'Roughness',
    outcome: outside === 0 ? 'good' : 'look',
    finding:
      outside === 0 ? `${range}.` : `${range}; ${counted(outside, 'value')} outside of the table.`,
    rule: `Between ${min} and ${max} (${ROUGHNESS_SOURCE}).`,
  };
};
