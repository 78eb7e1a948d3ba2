import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { UserChangeBody } from '@/shared/accounts/schemas';
import type { UserRow } from '@/shared/accounts/types';
import { api } from './apiClient';

export const userKeys = { list: () => ['users'] as const };

/** The people of the firm. */
export const useUsers = () =>
  useQuery({
    queryKey: userKeys.list(),
    queryFn: ({ signal }) => api.get<UserRow[]>('/users', { signal }),
  });

export function useChangeUser() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...body }: UserChangeBody & { id: number }) =>
      api.patch<UserRow>(`/users/${id}`, body),
    onSuccess: () => client.invalidateQueries({ queryKey: userKeys.list() }),
  });
}
