import type { Href } from 'expo-router';
import type { Study } from '@/shared/studies/types';

export interface NextStep {
  label: string;
  href: Href;
}

/** The one thing to do next on the path of a study. */
export function nextStep(study: Study): NextStep {
  const root = `/studies/${study.id}` as const;
  const { counts } = study;
  if (counts && counts.surveysWaiting > 0)
    return { label: 'Look at the survey handed in', href: `${root}/survey` };
  if (!counts?.surveyRevision) return { label: 'Hand in the survey', href: `${root}/survey` };
  if (counts.scenarios === 0) return { label: 'Set up a scenario', href: `${root}/scenarios` };
  if (counts.runs === 0) return { label: 'Route a flood', href: `${root}/scenarios` };
  return { label: 'See the runs', href: `${root}/runs` };
}
