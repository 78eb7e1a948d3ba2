import { keepPreviousData, useInfiniteQuery, useMutation } from '@tanstack/react-query';
import type { AuditPage } from '@/shared/audit/types';
import { api } from './apiClient';

export interface AuditFilter {
  actor: string;
  action: string;
}

const query = ({ actor, action }: AuditFilter) => ({
  actor: actor.trim() || undefined,
  action: action.trim() || undefined,
});

/** The trail, newest first, a page at a time. */
export const useAudit = (filter: AuditFilter) =>
  useInfiniteQuery({
    queryKey: ['audit', query(filter)],
    queryFn: ({ signal, pageParam }) =>
      api.get<AuditPage>('/audit', { signal, query: { ...query(filter), before: pageParam } }),
    initialPageParam: null as number | null,
    getNextPageParam: ({ next }) => next,
    placeholderData: keepPreviousData,
  });

/** The same as a file. */
export const useAuditDownload = () =>
  useMutation({
    mutationFn: (filter: AuditFilter) =>
      api.download('/audit.csv', 'audit.csv', { query: query(filter) }),
  });
