import type { Crumb } from '@/components/layout/Crumbs';
import type { Run } from '@/shared/runs/types';

/** The way to a run. */
export const runCrumbs = (run: Run): Crumb[] => [
  { label: run.studyTitle, href: `/studies/${run.studyId}` },
  { label: 'Runs', href: `/studies/${run.studyId}/runs` },
  { label: `Run ${run.number}` },
];
