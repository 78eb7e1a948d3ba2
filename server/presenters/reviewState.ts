import type { ReviewState } from '../../shared/review/types';
import type { RunModel } from '../models/Run';

/** Where the checking of a run stands: the latest of what was written of it. Needs its `CHECKING`. */
export function reviewStateOf({
  issue,
  review,
  signOff,
  withdrawal,
}: RunModel): ReviewState | null {
  if (withdrawal) return 'withdrawn';
  if (issue) return 'issued';
  if (signOff) return 'signed';
  return review && review.state !== 'draft' ? review.state : null;
}
