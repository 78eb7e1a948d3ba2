import type { Message } from '../Mailer';

export const passwordResetMessage = (to: string, link: string): Message => ({
  to,
  subject: 'Choose a new password for Spate',
  text: `Somebody, you we trust, asked for a new password for this address.

Choose it here:
${link}

The link works once and for one hour. If it was not you, leave it alone: your password stays as it is.
`,
});
