import { useLocalSearchParams, useRouter } from 'expo-router';
import { useMemo } from 'react';
import { useResiduals } from '@/components/queries/calibration';
import { useObservations } from '@/components/queries/observations';
import { observedLevels } from '@/shared/calibration/observedLevels';
import type { Run } from '@/shared/runs/types';

/**
 * The observed flood that is drawn beside a run: none before one is chosen, for marks of an old flood beside a design flood
 * would look like a bad model. The address keeps the choice.
 */
export function useObservedFlood(run: Run) {
  const router = useRouter();
  const { observed: wanted } = useLocalSearchParams<{ observed?: string }>();
  const floods = useObservations(run.studyId).data?.floods ?? NONE;
  const chosen = wanted !== undefined && floods.includes(wanted) ? wanted : null;
  const { data, error, refetch } = useResiduals(run.id, chosen, chosen !== null);
  const residuals = chosen !== null && data?.flood === chosen ? data : null;
  return {
    floods,
    chosen,
    residuals,
    levels: useMemo(() => (residuals ? observedLevels(residuals) : NONE), [residuals]),
    error: chosen === null ? null : error,
    retry: () => void refetch(),
    choose: (flood: string | null) => router.setParams({ observed: flood ?? undefined }),
  };
}

export type ObservedFloodChoice = ReturnType<typeof useObservedFlood>;

const NONE: never[] = [];
