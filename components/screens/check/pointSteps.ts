import type { PointStep } from '@/components/queries/reviews';
import type { Review, ReviewPoint } from '@/shared/review/types';

export interface PointStepChoice {
  step: PointStep;
  label: string;
}

/** What may be done with a point next: the modeller answers, whoever checks closes it or opens it again. */
export function pointSteps({ state }: Pick<ReviewPoint, 'state'>, may: Review['may']) {
  const steps: PointStepChoice[] = [];
  if (state !== 'closed' && may.includes('review.answer'))
    steps.push({ step: 'answer', label: state === 'open' ? 'Answer' : 'Answer again' });
  if (!may.includes('review.close')) return steps;
  if (state === 'closed') steps.push({ step: 'reopen', label: 'Open again' });
  else steps.push({ step: 'close', label: 'Close' });
  if (state === 'answered') steps.push({ step: 'reopen', label: 'Not settled' });
  return steps;
}
