import type { InvitationRow, Me, Session, UserRow } from '../../shared/accounts/types';
import type { Tokens } from '../auth/sessions';
import type { InvitationModel } from '../models/Invitation';
import type { UserModel } from '../models/User';

/** Needs the user's `firm`. */
export function presentMe(user: UserModel): Me {
  const firm = user.firm!;
  return {
    id: user.id,
    email: user.email,
    name: user.name,
    roles: user.roles,
    firm: { id: firm.id, name: firm.name },
    qualification: user.qualification ?? null,
    registrationNumber: user.registrationNumber ?? null,
  };
}

export const presentSession = ({ user, accessToken, expiresIn }: Tokens): Session => ({
  accessToken,
  expiresIn,
  me: presentMe(user),
});

export const presentUserRow = (user: UserModel): UserRow => ({
  id: user.id,
  email: user.email,
  name: user.name,
  roles: user.roles,
  active: user.active,
  lastSignInAt: user.lastSignInAt?.toISOString() ?? null,
});

/** Needs `invitedBy`. */
export const presentInvitationRow = (invitation: InvitationModel): InvitationRow => ({
  id: invitation.id,
  email: invitation.email,
  roles: invitation.roles,
  studyId: invitation.studyId ?? null,
  invitedBy: invitation.invitedBy!.name,
  createdAt: invitation.createdAt.toISOString(),
  expiresAt: invitation.expiresAt.toISOString(),
  acceptedAt: invitation.acceptedAt?.toISOString() ?? null,
});
