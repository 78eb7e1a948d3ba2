import { partsOf, say, sayAll } from '../../../../shared/units/message';
import { counted, type ChecklistRule } from './types';

export const warnings: ChecklistRule = ({ run }) => ({
  id: 'warnings',
  title: 'Warnings of the run',
  outcome: run.warnings.length === 0 ? 'good' : 'look',
  finding:
    run.warnings.length === 0
      ? 'None.'
      : say`${counted(run.warnings.length, 'warning')}: ${partsOf(sayAll(run.warnings.slice(0, 5)))}${run.warnings.length > 5 ? ` And ${run.warnings.length - 5} more.` : ''}`,
  rule: 'Each is understood and answered (common practice).',
});
