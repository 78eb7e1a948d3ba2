import { useReach, useReaches } from '@/components/queries/reaches';
import { newestReach } from '@/shared/reaches/newestReach';
import type { Reach, ReachRow } from '@/shared/reaches/types';

/** The reach of the latest accepted survey in short, once it is there. */
export function useNewestReachRow(studyId: number): ReachRow | null {
  return newestReach(useReaches(studyId).data ?? []) ?? null;
}

/** The same with its sections. */
export function useNewestReach(studyId: number): Reach | undefined {
  return useReach(useNewestReachRow(studyId)?.id ?? null).data;
}
