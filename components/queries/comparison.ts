import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { COMPARED_RUNS } from '@/shared/comparison/schemas';
import type { RunComparison } from '@/shared/comparison/types';
import { api } from './apiClient';

/** Runs side by side, in the order asked; asked once there are two. */
export const useComparison = (studyId: number, runIds: readonly number[]) =>
  useQuery({
    queryKey: ['comparison', studyId, ...runIds],
    queryFn: ({ signal }) =>
      api.get<RunComparison>(`/studies/${studyId}/comparison`, {
        signal,
        query: { runs: runIds.join(',') },
      }),
    enabled: runIds.length >= COMPARED_RUNS.min,
    placeholderData: keepPreviousData,
  });
