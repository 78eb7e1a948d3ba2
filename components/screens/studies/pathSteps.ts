import type { Href } from 'expo-router';
import type { Study } from '@/shared/studies/types';

export interface PathStep {
  name: string;
  href: Href;
  /** How far it has come, in words. */
  state: string;
  isDone: boolean;
}

const counted = (count: number, one: string, many: string): string =>
  count === 1 ? `1 ${one}` : `${count} ${many}`;

function surveyState(revision: number | null, waiting: number): string {
  const accepted = revision && `revision ${revision} accepted`;
  const waits = waiting > 0 && `${waiting === 1 ? 'one' : waiting} handed in, to accept or return`;
  const words = [accepted, waits].filter(Boolean).join('; ') || 'no file handed in yet';
  return words[0].toUpperCase() + words.slice(1);
}

/** The path of a study from the surveyor's file to the routed flood. */
export function pathSteps(study: Study): PathStep[] {
  const root = `/studies/${study.id}` as const;
  const revision = study.counts?.surveyRevision ?? null;
  const sections = study.counts?.sections ?? 0;
  const scenarios = study.counts?.scenarios ?? 0;
  const runs = study.counts?.runs ?? 0;
  return [
    {
      name: 'Survey',
      href: `${root}/survey`,
      state: surveyState(revision, study.counts?.surveysWaiting ?? 0),
      isDone: revision !== null,
    },
    {
      name: 'Reach',
      href: `${root}/reach`,
      state:
        sections > 0
          ? counted(sections, 'cross-section', 'cross-sections')
          : 'Made from the first accepted survey',
      isDone: sections > 0,
    },
    {
      name: 'Scenarios',
      href: `${root}/scenarios`,
      state: scenarios > 0 ? counted(scenarios, 'scenario', 'scenarios') : 'No flood described yet',
      isDone: scenarios > 0,
    },
    {
      name: 'Runs',
      href: `${root}/runs`,
      state: runs > 0 ? counted(runs, 'run', 'runs') : 'Nothing routed yet',
      isDone: runs > 0,
    },
  ];
}
