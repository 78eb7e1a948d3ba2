import path from 'node:path';
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '../../seed/accounts';
import { ROLE_NAMES } from '../../shared/accounts/roles';
import { startServer } from '..';
import { readEnv } from '../env';
import { withCleanup, type Cleanup } from './cleanup';
import { claimDataDirectory } from './dataDirectory';
import { explain } from './explain';
import { prepareDatabase } from './prepareDatabase';
import { refuseBusyPort } from './freePort';
import { ensureWebExport } from './webExport';

const ROOT = path.resolve(__dirname, '../..');

/** `npm start`. */
export const startProduct = (): Promise<void> => withCleanup(start, explain);

async function start(cleanup: Cleanup): Promise<void> {
  // Read with a database that is not there yet, so that a bad setting is told before anything is started.
  const settings = (databaseUrl: string, webDir?: string) =>
    readEnv({
      DEMO_DATA: 'yes',
      LOG_LEVEL: 'warn',
      ...process.env,
      DATABASE_URL: databaseUrl,
      WEB_DIR: webDir ?? process.env.WEB_DIR,
    });
  const { dataDir, host, port } = settings(process.env.DATABASE_URL ?? 'mariadb://none/none');
  await refuseBusyPort(port, host);
  cleanup.add(claimDataDirectory(dataDir));
  const databaseUrl = await prepareDatabase(dataDir, process.env.DATABASE_URL, cleanup);
  const webDir = process.env.WEB_DIR ?? (await ensureWebExport(ROOT, cleanup));

  const env = settings(databaseUrl, webDir);
  const running = await cleanup.stopLater(startServer(env));
  if (env.demoData) console.log(demoAccounts());
  console.log(`\nSpate serves on ${running.url}   (Ctrl-C stops it)`);
}

/** Who can sign in to the demo data, a line each. */
function demoAccounts(): string {
  const width = Math.max(...DEMO_ACCOUNTS.map(({ email }) => email.length));
  const lines = DEMO_ACCOUNTS.map(({ email, roles, firm }) => {
    const names = roles.map((role) => ROLE_NAMES[role].toLowerCase()).join(', ');
    return `  ${email.padEnd(width)}   ${names}, ${firm}`;
  });
  return [`\nDemo accounts, all with the password "${DEMO_PASSWORD}":`, ...lines].join('\n');
}
