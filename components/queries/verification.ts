import { useQuery } from '@tanstack/react-query';
import type { Verification } from '@/shared/review/types';
import { api } from './apiClient';

/** Standing of the report that carries a code; public. Asked once a visit: the server limits how often. */
export const useVerification = (code: string) =>
  useQuery({
    queryKey: ['verification', code],
    queryFn: ({ signal }) =>
      api.get<Verification>(`/verification/${encodeURIComponent(code)}`, { signal }),
    enabled: code !== '',
    refetchOnWindowFocus: false,
    retry: false,
  });
