import { createTransport } from 'nodemailer';
import type { Mailer } from './Mailer';

/** Hands messages to the mail server of `SMTP_URL`. */
export function smtpMailer(smtpUrl: string, from: string): Mailer {
  const transport = createTransport(smtpUrl, { from });
  return {
    send: async ({ to, subject, text }) => {
      await transport.sendMail({ to, subject, text });
    },
    close: () => transport.close(),
  };
}
