import { useMutation, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { PlanCollection } from '@/shared/reaches/plan/geoJson';
import type { GeometryChangeBody } from '@/shared/reaches/schemas';
import type { Reach, ReachChange } from '@/shared/reaches/types';
import { api } from './apiClient';
import { isApiError } from './ApiError';
import { reachKeys } from './reaches';
import { scenarioKeys } from './scenarios';

const geometryKeys = {
  changes: (reachId: number) => ['reaches', reachId, 'changes'] as const,
  runPlan: (runId: number) => ['runs', runId, 'plan'] as const,
};

/** A working geometry: a named copy of a reach of the study. */
export function useCopyGeometry(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { name: string; copyOf: number }) =>
      api.post<Reach>(`/studies/${studyId}/reaches`, body),
    onSuccess: (reach) => stored(client, reach),
  });
}

/** ApiError `conflict` where somebody else saved since `version`: what they saved is then read. */
export function useSaveGeometry(reachId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: GeometryChangeBody) => api.put<Reach>(`/reaches/${reachId}/geometry`, body),
    onSuccess: (reach) => stored(client, reach),
    onError: (error) =>
      isApiError(error, 'conflict')
        ? client.invalidateQueries({ queryKey: reachKeys.one(reachId) })
        : undefined,
  });
}

export function useRenameGeometry(reachId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (name: string) => api.patch<Reach>(`/reaches/${reachId}`, { name }),
    onSuccess: (reach) => stored(client, reach),
  });
}

/** ApiError `conflict` where scenarios or runs stand on it. */
export function useRemoveGeometry(studyId: number, reachId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => api.delete(`/reaches/${reachId}`),
    onSuccess: () => client.invalidateQueries({ queryKey: reachKeys.list(studyId) }),
  });
}

/** Newest first. */
export const useReachChanges = (reachId: number) =>
  useQuery({
    queryKey: geometryKeys.changes(reachId),
    queryFn: ({ signal }) => api.get<ReachChange[]>(`/reaches/${reachId}/changes`, { signal }),
  });

/** Sections, centre line and peak extent of a run; null: none to ask for. */
export const useRunPlan = (runId: number | null) =>
  useQuery({
    queryKey: geometryKeys.runPlan(runId ?? 0),
    queryFn: ({ signal }) => api.get<PlanCollection>(`/runs/${runId}/plan.geojson`, { signal }),
    enabled: runId !== null,
  });

export const downloadReachPlan = (reachId: number) =>
  api.download(`/reaches/${reachId}/plan.geojson`, 'plan.geojson');

export const downloadRunPlan = (runId: number) =>
  api.download(`/runs/${runId}/plan.geojson`, 'plan.geojson');

function stored(client: QueryClient, reach: Reach) {
  client.setQueryData(reachKeys.one(reach.id), reach);
  return Promise.all([
    client.invalidateQueries({ queryKey: reachKeys.list(reach.studyId) }),
    client.invalidateQueries({ queryKey: geometryKeys.changes(reach.id) }),
    client.invalidateQueries({ queryKey: scenarioKeys.all }),
  ]);
}
