import type { ChecklistRule } from './types';

export const suddenFailure: ChecklistRule = ({ caseFile }) =>
  caseFile.initial.kind === 'dam'
    ? {
        id: 'suddenFailure',
        title: 'Failure of the dam',
        outcome: 'asked',
        finding:
          'The whole dam is gone at once; no breach is formed over time. Say why that is right for this dam, or on the safe side.',
        rule: 'Embankments breach over time; published regressions on past failures give width and time (e.g. Froehlich 2008). Concrete arch dams may go at once (common practice).',
      }
    : null;
