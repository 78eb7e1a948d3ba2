import type {
  InvitationAcceptBody,
  PasswordChangeBody,
  PasswordResetConfirmBody,
  ProfileBody,
  SignInBody,
} from '@/shared/accounts/schemas';
import type { InvitationPreview, Me, Session } from '@/shared/accounts/types';
import { useQuery } from '@tanstack/react-query';
import { api } from './apiClient';

/** What a person does with their own account. Sessions that come back are opened by `useSession`. */
export const accounts = {
  signIn: (body: SignInBody) => api.post<Session>('/auth/sign-in', body),
  requestReset: (email: string) => api.post('/auth/password-reset/request', { email }),
  confirmReset: (body: PasswordResetConfirmBody) => api.post('/auth/password-reset/confirm', body),
  acceptInvitation: (body: InvitationAcceptBody) => api.post<Session>('/invitations/accept', body),
  changeProfile: (body: ProfileBody) => api.patch<Me>('/me', body),
  changePassword: (body: PasswordChangeBody) => api.post('/auth/password', body),
  signOutEverywhere: () => api.post('/auth/sign-out-everywhere'),
};

/** What stands behind an invitation link; asked once. */
export const useInvitationPreview = (token: string) =>
  useQuery({
    queryKey: ['invitationPreview', token],
    queryFn: () => api.post<InvitationPreview>('/invitations/look', { token }),
    enabled: token !== '',
    staleTime: Infinity,
  });
