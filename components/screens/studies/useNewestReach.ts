import { useReach, useReaches } from '@/components/queries/reaches';
import type { Reach, ReachRow } from '@/shared/reaches/types';

/** The reach of the latest accepted survey in short, once it is there. */
export function useNewestReachRow(studyId: number): ReachRow | null {
  const rows = useReaches(studyId).data ?? [];
  return rows.reduce<ReachRow | null>(
    (best, row) => (best === null || row.revision > best.revision ? row : best),
    null,
  );
}

/** The same with its sections. */
export function useNewestReach(studyId: number): Reach | undefined {
  return useReach(useNewestReachRow(studyId)?.id ?? null).data;
}
