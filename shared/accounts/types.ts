import type { Role } from './roles';

/** The person who is signed in: `GET /api/me`. */
export interface Me {
  id: number;
  email: string;
  name: string;
  roles: Role[];
  firm: { id: number; name: string };
  /** Professional standing, printed where the person signs. */
  qualification: string | null;
  registrationNumber: string | null;
}

/** Answer to signing in, refreshing, and accepting an invitation; the refresh token travels in a cookie. */
export interface Session {
  accessToken: string;
  /** Seconds that the access token holds. */
  expiresIn: number;
  me: Me;
}

/** A person of the firm as its administrators see them: `GET /api/users`. */
export interface UserRow {
  id: number;
  email: string;
  name: string;
  roles: Role[];
  active: boolean;
  lastSignInAt: string | null;
}

/** `GET /api/invitations`. */
export interface InvitationRow {
  id: number;
  email: string;
  roles: Role[];
  studyId: number | null;
  invitedBy: string;
  createdAt: string;
  expiresAt: string;
  acceptedAt: string | null;
}

/** What an invitation link shows before it is accepted: `POST /api/invitations/look`. */
export interface InvitationPreview {
  email: string;
  firmName: string;
  roles: Role[];
}
