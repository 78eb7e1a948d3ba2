import { partsOf, say, sayAll } from '../../../../shared/units/message';
import { counted, type ChecklistRule } from './types';

export const surveyAdvice: ChecklistRule = ({ advice }) => ({
  id: 'surveyAdvice',
  title: 'Advice on the survey left open',
  outcome: advice.length === 0 ? 'good' : 'look',
  finding:
    advice.length === 0
      ? 'None.'
      : say`${counted(advice.length, 'note')} on the reach: ${partsOf(sayAll(advice.slice(0, 5)))}${advice.length > 5 ? ` And ${advice.length - 5} more.` : ''}`,
  rule: 'Each is mended or answered before the result is used (common practice).',
});
