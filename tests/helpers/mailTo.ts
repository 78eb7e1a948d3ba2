import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import type { KeptMessage } from '../../server/mail/fileMailer';

/** Subjects and texts of what was sent to an address, by the mailbox that the running product keeps. */
export function mailTo(email: string): string {
  const mailbox = path.join(process.env.SPATE_E2E_DATA_DIR!, 'mail');
  return readdirSync(mailbox)
    .filter((name) => name.endsWith('.json'))
    .map((name) => JSON.parse(readFileSync(path.join(mailbox, name), 'utf8')) as KeptMessage)
    .filter(({ to }) => to === email)
    .map(({ subject, text }) => `${subject}\n${text}`)
    .join('\n');
}
