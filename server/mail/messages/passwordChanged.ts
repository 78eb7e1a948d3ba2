import type { Message } from '../Mailer';

export const passwordChangedMessage = (to: string, resetLink: string): Message => ({
  to,
  subject: 'Your password for Spate was changed',
  text: `The password of your account was changed just now, and other devices were signed out.

If it was not you, choose a new one at once:
${resetLink}
`,
});
