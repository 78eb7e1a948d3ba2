import { useRouter } from 'expo-router';
import { useMemo } from 'react';
import { useReview } from '@/components/queries/reviews';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Run, RunSummary } from '@/shared/runs/types';
import { raisedPoints } from '../../check/raisedPoints';

/** What was raised on a run when it was checked, for its drawings; a point leads to what was said of it. */
export function useRaisedPoints(run: Run, summary: RunSummary) {
  const router = useRouter();
  const system = useUnitSystem();
  const points = useReview(run.id).data?.points;
  const { stations } = summary;
  const raised = useMemo(
    () => raisedPoints(points ?? [], stations, run.duration, system),
    [points, stations, run.duration, system],
  );
  const { id: runId, studyId } = run;
  const onPoint = (point: number) =>
    router.push({
      pathname: '/studies/[studyId]/runs/[runId]/check',
      params: { studyId, runId, point },
    });
  return { raised, onPoint };
}
