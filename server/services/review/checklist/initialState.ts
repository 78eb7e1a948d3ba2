import { sayAll } from '../../../../shared/units/message';
import type { ChecklistRule } from './types';

const CODES = new Set(['initialNotSettled', 'initialDry', 'damMoved']);
const KINDS = {
  steady: 'Started from the steady state of the first inflow.',
  still: 'Started from still water.',
  profile: 'Started from a given profile.',
  dam: 'Started with a dam gone at once.',
} as const;

export const initialState: ChecklistRule = ({ caseFile, run }) => {
  const said = run.warnings.filter(({ code }) => CODES.has(code));
  return {
    id: 'initialState',
    title: 'Initial state',
    outcome: said.length === 0 ? 'good' : 'look',
    finding: sayAll([{ message: KINDS[caseFile.initial.kind] }, ...said]),
    rule: 'The state at the start is settled, or its settling is over before the flood comes (common practice).',
  };
};
