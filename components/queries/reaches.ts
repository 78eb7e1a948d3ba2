import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { SectionsChangeBody } from '@/shared/reaches/schemas';
import type { Reach, ReachRow } from '@/shared/reaches/types';
import { api } from './apiClient';
import { scenarioKeys } from './scenarios';

export const reachKeys = {
  list: (studyId: number) => ['reaches', 'ofStudy', studyId] as const,
  one: (reachId: number) => ['reaches', reachId] as const,
};

/** One reach an accepted revision, and the working geometries; not asked for where they may not be read. */
export const useReaches = (studyId: number, mayRead = true) =>
  useQuery({
    queryKey: reachKeys.list(studyId),
    queryFn: ({ signal }) => api.get<ReachRow[]>(`/studies/${studyId}/reaches`, { signal }),
    enabled: mayRead,
  });

/** Null: none to ask for. */
export const useReach = (reachId: number | null) =>
  useQuery({
    queryKey: reachKeys.one(reachId ?? 0),
    queryFn: ({ signal }) => api.get<Reach>(`/reaches/${reachId}`, { signal }),
    enabled: reachId !== null,
  });

/** Bank marks and roughness of some sections. ApiError `conflict` where somebody else was quicker. */
export function useChangeSections(studyId: number, reachId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SectionsChangeBody) =>
      api.patch<Reach>(`/reaches/${reachId}/sections`, body),
    onSuccess: (reach) => {
      client.setQueryData(reachKeys.one(reachId), reach);
      return Promise.all([
        client.invalidateQueries({ queryKey: reachKeys.list(studyId) }),
        client.invalidateQueries({ queryKey: scenarioKeys.all }),
      ]);
    },
  });
}
