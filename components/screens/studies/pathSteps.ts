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
      state: revision ? `Revision ${revision} accepted` : 'No file handed in yet',
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
