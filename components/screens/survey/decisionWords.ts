import { wallClock } from '@/components/ui/wallClock';
import type { SurveyRevisionRow } from '@/shared/surveys/types';

/** Where a revision stands, in few words. */
export function decisionWords({ decision }: Pick<SurveyRevisionRow, 'decision'>): string {
  if (!decision) return 'Waits for an engineer';
  const how = decision.decision === 'accepted' ? 'Accepted' : 'Returned';
  return `${how} by ${decision.by}, ${wallClock(decision.at)}`;
}
