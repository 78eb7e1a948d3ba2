import type { ComparedRun } from '@/shared/comparison/types';

/** As a curve or a column is named. */
export const runName = ({ number, scenarioName }: Pick<ComparedRun, 'number' | 'scenarioName'>) =>
  `Run ${number}, ${scenarioName}`;
