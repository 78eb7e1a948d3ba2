import type { Run } from '@/shared/runs/types';
import type { PictureSource } from './pictureContext';

/** Where a picture of a run's results comes from: nothing unsigned leaves the page without saying so. */
export const pictureSource = (
  run: Pick<Run, 'studyTitle' | 'number' | 'scenarioName' | 'review'>,
): PictureSource => ({
  stem: `Run ${run.number}`,
  study: run.studyTitle,
  run: `Run ${run.number}, ${run.scenarioName}`,
  state: stateWords(run.review),
});

function stateWords(review: Run['review']): string {
  if (review === 'withdrawn') return 'Withdrawn, not to be relied on';
  return review === 'signed' || review === 'issued' ? 'Signed' : 'Preliminary, not signed';
}
