import { ROLE_NAMES, type Role } from '../../../shared/accounts/roles';
import type { Message } from '../Mailer';

interface Facts {
  to: string;
  firmName: string;
  invitedBy: string;
  roles: Role[];
  /** Of the study that is shared; null for an account of the firm at large. */
  studyTitle: string | null;
  link: string;
  days: number;
}

export function invitationMessage(facts: Facts): Message {
  const as = facts.roles.map((role) => ROLE_NAMES[role].toLowerCase()).join(' and ');
  const where = facts.studyTitle
    ? `the study “${facts.studyTitle}” of ${facts.firmName}`
    : facts.firmName;
  return {
    to: facts.to,
    subject: `${facts.firmName} invites you to Spate`,
    text: `${facts.invitedBy} invites you to ${where} as ${as}.

Choose a password here:
${facts.link}

The link works once and for ${facts.days} days. If you did not expect it, leave it alone: nothing happens without you.
`,
  };
}
