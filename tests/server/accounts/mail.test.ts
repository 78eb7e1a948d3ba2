import { mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { SMTPServer } from 'smtp-server';
import { fileMailer, type KeptMessage } from '../../../server/mail/fileMailer';
import { smtpMailer } from '../../../server/mail/smtpMailer';

const message = {
  to: 'someone@client.example',
  subject: 'Grüße',
  text: 'Read it:\nhttp://spate.example/reset?token=abc\n',
};

test('without a mail server each message is kept as a file for its owner alone', async () => {
  const dir = mkdtempSync(path.join(os.tmpdir(), 'spate-mail-'));
  try {
    const mailer = fileMailer(dir, 'Spate <spate@localhost>', () => new Date(0));
    await mailer.send(message);
    await mailer.send({ ...message, to: 'another@client.example' });
    const names = readdirSync(dir).sort();
    expect(names.map((name) => path.extname(name))).toEqual(['.eml', '.json', '.eml', '.json']);
    const kept = JSON.parse(readFileSync(path.join(dir, names[1]!), 'utf8')) as KeptMessage;
    expect(kept).toEqual({
      ...message,
      sentAt: '1970-01-01T00:00:00.000Z',
      links: ['http://spate.example/reset?token=abc'],
    });
    const eml = readFileSync(path.join(dir, names[0]!), 'utf8');
    expect(eml).toMatch(/^From: Spate <spate@localhost>/m);
    expect(eml).toMatch(/^To: someone@client\.example/m);
    expect(statSync(path.join(dir, names[0]!)).mode & 0o077).toBe(0);
  } finally {
    rmSync(dir, { recursive: true });
  }
});

test('with a mail server messages go to it', async () => {
  const received: string[] = [];
  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData: (stream, _session, done) => {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('end', () => {
        received.push(Buffer.concat(parts).toString('utf8'));
        done();
      });
    },
  });
  await new Promise<void>((resolve) => smtp.listen(0, '127.0.0.1', () => resolve()));
  const { port } = smtp.server.address() as AddressInfo;
  const mailer = smtpMailer(`smtp://127.0.0.1:${port}`, 'Spate <spate@firm.example>');
  try {
    await mailer.send(message);
    expect(received).toHaveLength(1);
    expect(received[0]).toMatch(/^From: Spate <spate@firm\.example>/m);
    expect(received[0]).toContain('someone@client.example');
  } finally {
    mailer.close();
    await new Promise<void>((resolve) => smtp.close(() => resolve()));
  }
  await expect(mailer.send(message)).rejects.toThrow();
});
