import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { IssuedResult } from '@/shared/review/types';
import { api } from './apiClient';

export const issuedKeys = {
  all: ['issued'] as const,
  of: (studyId: number) => [...issuedKeys.all, studyId] as const,
};

/** What was issued to the client of a study, newest first. */
export const useIssued = (studyId: number) =>
  useQuery({
    queryKey: issuedKeys.of(studyId),
    queryFn: ({ signal }) => api.get<IssuedResult[]>(`/studies/${studyId}/issued`, { signal }),
  });

/** The client confirms that they read it; the firm sees that. */
export function useConfirmRead(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (runId: number) => api.post(`/issued/${runId}/read`),
    onSuccess: () => client.invalidateQueries({ queryKey: issuedKeys.of(studyId) }),
  });
}

export const useIssuedReport = () =>
  useMutation({
    mutationFn: (runId: number) =>
      api.download(`/issued/${runId}/report.pdf`, `report-run-${runId}.pdf`),
  });
