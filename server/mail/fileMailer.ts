import { mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { createTransport } from 'nodemailer';
import type { Mailer, Message } from './Mailer';

/** What a kept message says, as JSON beside its .eml. */
export interface KeptMessage extends Message {
  sentAt: string;
  /** Addresses in the text, in order. */
  links: string[];
}

/**
 * Sends nothing: keeps each message as an .eml that a mail program opens, and as .json. Used where no mail server is
 * named. Names sort by time.
 */
export function fileMailer(dir: string, from: string, now: () => Date): Mailer {
  const transport = createTransport({ streamTransport: true, buffer: true }, { from });
  let count = 0;
  return {
    send: async (message) => {
      const sentAt = now().toISOString();
      const { to, subject, text } = message;
      const sent = await transport.sendMail({ to, subject, text });
      const kept: KeptMessage = { ...message, sentAt, links: text.match(/https?:\/\/\S+/g) ?? [] };
      const order = String(++count).padStart(4, '0');
      const name = `${sentAt.replaceAll(/[:.]/g, '-')}-${process.pid}-${order}`;
      // Its links open accounts: for the owner's eyes only.
      await mkdir(dir, { recursive: true, mode: 0o700 });
      await writeFile(path.join(dir, `${name}.eml`), sent.message as Buffer, { mode: 0o600 });
      await writeFile(path.join(dir, `${name}.json`), `${JSON.stringify(kept, null, 2)}\n`, {
        mode: 0o600,
      });
    },
    close: () => transport.close(),
  };
}
