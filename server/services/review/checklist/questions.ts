import type { ChecklistRule } from './types';

const ask =
  (id: string, title: string, finding: string, rule: string): ChecklistRule =>
  () => ({ id, title, outcome: 'asked', finding, rule });

/** What no machine can find out. */
export const QUESTIONS: ChecklistRule[] = [
  ask(
    'purpose',
    'Fit for the purpose',
    'Does the run answer what the study asks, at the places and for the flood that it names?',
    'The purpose stands in the study.',
  ),
  ask(
    'hydrology',
    'Source of the flood',
    'Where do the peak, the shape and the lateral inflows come from, and who stands behind them?',
    'Inflows are traced to a named source (common practice).',
  ),
  ask(
    'leftOut',
    'Structures and storage left out',
    'Which bridges, weirs, culverts, embankments and side storage are not in the model, and what would they change?',
    'What is left out is named with its effect (common practice).',
  ),
];
