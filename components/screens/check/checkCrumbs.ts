import type { Crumb } from '@/components/layout/Crumbs';
import type { Run } from '@/shared/runs/types';
import { runCrumbs } from '../runs/runCrumbs';

/** The way to the check of a run. */
export const checkCrumbs = (run: Run): Crumb[] => [
  ...runCrumbs(run).map((crumb) =>
    crumb.href ? crumb : { ...crumb, href: `/studies/${run.studyId}/runs/${run.id}` as const },
  ),
  { label: 'Check' },
];
