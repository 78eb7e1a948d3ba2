import { buildAttempts } from '../../auth/attempts';
import { buildOneTimeLinks } from '../../auth/oneTimeLinks';
import type { Sessions } from '../../auth/sessions';
import type { Background } from '../../background';
import type { Mailer } from '../../mail/Mailer';
import type { Platform } from '../../platform';
import { buildAcceptInvitation } from './acceptInvitation';
import { buildFirms } from './firms';
import { buildInvitations } from './invitations';
import { buildPasswords } from './passwords';
import { buildSignIn } from './signIn';
import { buildUsers } from './users';

interface Needs {
  background: Background;
  mailer: Mailer;
  sessions: Sessions;
}

/** Everything about accounts. */
export function buildAccounts(platform: Platform, needs: Needs) {
  const { mailer, sessions } = needs;
  const attempts = buildAttempts(platform);
  const links = buildOneTimeLinks(platform);
  return {
    signIn: buildSignIn(platform, attempts, sessions),
    passwords: buildPasswords(platform, { ...needs, attempts, links }),
    firms: buildFirms(platform, links),
    users: buildUsers(platform, sessions, links),
    invitations: buildInvitations(platform, links, mailer),
    acceptInvitation: buildAcceptInvitation(platform, links, sessions),
    /** Forgets what has run out. */
    sweep: async () => {
      await sessions.sweep();
      await attempts.sweep();
      await links.sweep();
    },
  };
}
