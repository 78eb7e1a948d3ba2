import { useReach, useReaches } from '@/components/queries/reaches';
import type { Reach } from '@/shared/reaches/types';

/** The reach of the latest accepted survey, once it is there. */
export function useNewestReach(studyId: number): Reach | undefined {
  const rows = useReaches(studyId).data ?? [];
  const newest = rows.reduce<(typeof rows)[number] | null>(
    (best, row) => (best === null || row.revision > best.revision ? row : best),
    null,
  );
  return useReach(newest?.id ?? null).data;
}
