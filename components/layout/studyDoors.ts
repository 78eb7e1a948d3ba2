import type { StudyAction } from '@/shared/studies/types';

/** What a person must be allowed, one of it, to enter a screen of a study; by the segment after the study's id. */
const DOORS: Record<string, readonly StudyAction[]> = {
  survey: ['survey.read', 'survey.send'],
  reach: ['reach.read'],
  stations: ['reach.read'],
  scenarios: ['scenario.read'],
  runs: ['run.read'],
  confidence: ['run.read'],
  calibration: ['run.read'],
  compare: ['run.read'],
};

/** Screens without a door of their own are open to whoever sees the study. */
export function mayEnter(segment: string | undefined, may: readonly StudyAction[]): boolean {
  const needed = segment === undefined ? undefined : DOORS[segment];
  return needed === undefined || needed.some((action) => may.includes(action));
}
