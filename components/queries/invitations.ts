import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { InvitationBody } from '@/shared/accounts/schemas';
import type { InvitationRow } from '@/shared/accounts/types';
import { api } from './apiClient';

export const invitationKeys = { list: () => ['invitations'] as const };

/** Invitations that the person may see: all of the firm for administrators, else one's own. */
export const useInvitations = () =>
  useQuery({
    queryKey: invitationKeys.list(),
    queryFn: ({ signal }) => api.get<InvitationRow[]>('/invitations', { signal }),
  });

const useInvitationChange = <Argument, Answer>(change: (argument: Argument) => Promise<Answer>) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () => client.invalidateQueries({ queryKey: invitationKeys.list() }),
  });
};

export const useInvite = () =>
  useInvitationChange((body: InvitationBody) => api.post<InvitationRow>('/invitations', body));

export const useResendInvitation = () =>
  useInvitationChange((id: number) => api.post(`/invitations/${id}/resend`));

export const useWithdrawInvitation = () =>
  useInvitationChange((id: number) => api.delete(`/invitations/${id}`));
