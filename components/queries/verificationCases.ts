import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { Paper } from '@/shared/reports/types';
import type {
  VerificationCaseRow,
  VerificationDetail,
  VerificationList,
} from '@/shared/verificationCases/types';
import { api } from './apiClient';

export const verificationCaseKeys = {
  all: ['verificationCases'] as const,
  list: () => [...verificationCaseKeys.all, 'list'] as const,
  one: (caseId: string) => [...verificationCaseKeys.all, 'one', caseId] as const,
};

const LOOK_AGAIN_MS = 1500;

export const goesOn = ({ latest }: Pick<VerificationCaseRow, 'latest'>): boolean =>
  latest?.state === 'queued' || latest?.state === 'running';

/** All published cases; looked at again while one of them waits or runs. */
export const useVerificationCases = () =>
  useQuery({
    queryKey: verificationCaseKeys.list(),
    queryFn: ({ signal }) => api.get<VerificationList>('/verification-cases', { signal }),
    refetchInterval: ({ state }) => (state.data?.cases.some(goesOn) ? LOOK_AGAIN_MS : false),
  });

/** One of them with its last result; looked at again while it waits or runs. */
export const useVerificationCase = (caseId: string) =>
  useQuery({
    queryKey: verificationCaseKeys.one(caseId),
    queryFn: ({ signal }) =>
      api.get<VerificationDetail>('/verification-cases/result', { signal, query: { caseId } }),
    refetchInterval: ({ state }) => (state.data && goesOn(state.data.row) ? LOOK_AGAIN_MS : false),
  });

/** Puts cases into the queue: those that are named, or all. */
export function useRunCases() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (caseIds?: string[]) =>
      api.post<VerificationList>('/verification-cases/runs', caseIds ? { caseIds } : {}),
    onSuccess: (list) => client.setQueryData(verificationCaseKeys.list(), list),
    onSettled: () => client.invalidateQueries({ queryKey: verificationCaseKeys.all }),
  });
}

/** Cancels whatever of it waits or runs. */
export function useCancelCases() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (taskSetIds: number[]) =>
      Promise.all(taskSetIds.map((id) => api.post(`/task-sets/${id}/cancel`))),
    onSettled: () => client.invalidateQueries({ queryKey: verificationCaseKeys.all }),
  });
}

export const useAnnexDownload = () =>
  useMutation({
    mutationFn: (paper: Paper) =>
      api.download('/verification-cases/annex.pdf', 'published-cases.pdf', { query: { paper } }),
  });

export const useCaseValuesDownload = (caseId: string) =>
  useMutation({
    mutationFn: () =>
      api.download('/verification-cases/values.csv', `${caseId}.csv`, { query: { caseId } }),
  });
