import { keepPreviousData, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { SearchBody } from '@/shared/calibration/search/types';
import type { RunResiduals } from '@/shared/calibration/types';
import type { TaskSet } from '@/shared/tasks/types';
import { api } from './apiClient';
import { runKeys } from './runs';
import { scenarioKeys } from './scenarios';
import { studyKeys } from './studies';
import { taskSetChanged } from './tasks';

/** A run against an observed flood; without a name against the one that is reported, else the first. */
export const useResiduals = (runId: number, flood: string | null, enabled = true) =>
  useQuery({
    enabled,
    queryKey: runKeys.result(runId, 'residuals', flood ?? ' first'),
    queryFn: ({ signal }) =>
      api.get<RunResiduals>(`/runs/${runId}/residuals`, {
        signal,
        query: flood === null ? {} : { flood },
      }),
    placeholderData: keepPreviousData,
  });

/** What the report of the run prints; null for nothing. */
export function useReportFlood(runId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (flood: string | null) =>
      api.put<RunResiduals>(`/runs/${runId}/observed`, { flood }),
    onSuccess: () => client.invalidateQueries({ queryKey: runKeys.result(runId, 'residuals') }),
  });
}

export const useResidualsDownload = (runId: number) =>
  useMutation({
    mutationFn: (flood: string) =>
      api.download(`/runs/${runId}/residuals.csv`, `run-${runId}-residuals.csv`, {
        query: { flood },
      }),
  });

export function useRequestSearch(runId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SearchBody) => api.post<TaskSet>(`/runs/${runId}/calibrations`, body),
    onSuccess: (set) => taskSetChanged(client, set),
  });
}

/** A copy of the scenario with what the search found; `changed` where the scenario is no longer what was searched. */
export function useScenarioOfSearch(studyId: number, taskSetId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (name: string) =>
      api.post<{ scenarioId: number; changed: boolean }>(`/task-sets/${taskSetId}/scenario`, {
        name,
      }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: scenarioKeys.list(studyId) }),
        client.invalidateQueries({ queryKey: studyKeys.all }),
      ]),
  });
}
