import { readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import type { Services } from '../../server/composition';
import type { KeptMessage } from '../../server/mail/fileMailer';

/** What was sent to an address, oldest first, once nothing is under way. */
export async function keptMail({ background, env }: Services, to: string): Promise<KeptMessage[]> {
  await background.idle();
  const names = await readdir(env.mailDir).catch(() => []);
  const messages = await Promise.all(
    names
      .filter((name) => name.endsWith('.json'))
      .sort()
      .map(async (name) => JSON.parse(await readFile(path.join(env.mailDir, name), 'utf8'))),
  );
  return (messages as KeptMessage[]).filter((message) => message.to === to);
}

/** The token of the link in the last message to an address. */
export async function tokenIn(services: Services, to: string): Promise<string> {
  const link = (await keptMail(services, to)).at(-1)?.links[0];
  return new URL(link ?? 'http://none').searchParams.get('token') ?? '';
}
