import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { Paper, ReportRow } from '@/shared/reports/types';
import { api } from './apiClient';

export const reportKeys = {
  all: ['reports'] as const,
  of: (runId: number) => [...reportKeys.all, runId] as const,
};

/** Reports of a run that are kept. */
export const useReports = (runId: number) =>
  useQuery({
    queryKey: reportKeys.of(runId),
    queryFn: ({ signal }) => api.get<ReportRow[]>(`/runs/${runId}/reports`, { signal }),
  });

/** Saves the report; the first of a signed run on a paper is made and kept at that moment. */
export function useReportDownload(runId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ paper, annex }: { paper: Paper; annex: boolean }) =>
      api.download(`/runs/${runId}/report.pdf`, `report-run-${runId}.pdf`, {
        query: { paper, annex: String(annex) },
      }),
    onSuccess: () => client.invalidateQueries({ queryKey: reportKeys.of(runId) }),
  });
}
