import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { ConfidenceKind } from '@/shared/confidence/schemas';
import type { ConfidenceOptions } from '@/shared/confidence/types';
import type { TaskSet } from '@/shared/tasks/types';
import { api } from './apiClient';
import { taskSetChanged } from './tasks';

/** What can be varied of a routed run. */
export const useConfidenceOptions = (runId: number | null) =>
  useQuery({
    queryKey: ['confidenceOptions', runId],
    queryFn: ({ signal }) => api.get<ConfidenceOptions>(`/runs/${runId}/confidence`, { signal }),
    enabled: runId !== null,
  });

/** Puts a set into the queue; ApiError `invalid` with faults where the settings do not fit the run. */
export function useRequestConfidence(runId: number, kind: ConfidenceKind) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: object) => api.post<TaskSet>(`/runs/${runId}/confidence/${kind}`, body),
    onSuccess: (set) => taskSetChanged(client, set),
  });
}

export const CONFIDENCE_FILES = {
  result: { path: 'result.csv', label: 'Result as CSV' },
  members: { path: 'result.csv', label: 'Members as CSV' },
} as const;
export type ConfidenceFile = keyof typeof CONFIDENCE_FILES;

/** Saves a table of a finished set. */
export const useConfidenceDownload = (taskSetId: number) =>
  useMutation({
    mutationFn: (part: ConfidenceFile) =>
      api.download(`/task-sets/${taskSetId}/result.csv`, `set-${taskSetId}-${part}.csv`, {
        query: { part },
      }),
  });

/** Saves the case of one member: it can be routed again anywhere. */
export const useMemberCase = (taskSetId: number) =>
  useMutation({
    mutationFn: (taskId: number) =>
      api.download(
        `/task-sets/${taskSetId}/members/${taskId}/case.json`,
        `set-${taskSetId}-member-${taskId}-case.json`,
      ),
  });
