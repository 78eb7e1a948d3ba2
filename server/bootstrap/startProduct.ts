import path from 'node:path';
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
    readEnv({ ...process.env, DATABASE_URL: databaseUrl, WEB_DIR: webDir ?? process.env.WEB_DIR });
  const { dataDir, host, port } = settings(process.env.DATABASE_URL ?? 'mariadb://none/none');
  await refuseBusyPort(port, host);
  cleanup.add(claimDataDirectory(dataDir));
  const databaseUrl = await prepareDatabase(dataDir, process.env.DATABASE_URL, cleanup);
  const webDir = process.env.WEB_DIR ?? (await ensureWebExport(ROOT, cleanup));

  const running = await startServer(settings(databaseUrl, webDir));
  cleanup.add(running.stop);
  console.log(`\nSpate serves on ${running.url}   (Ctrl-C stops it)`);
}
