import { spawn } from 'node:child_process';
import path from 'node:path';
import { withCleanup, type Cleanup } from './cleanup';
import { claimDataDirectory } from './dataDirectory';
import { explain } from './explain';
import { freePort, refuseBusyPort } from './freePort';
import { prepareDatabase } from './prepareDatabase';
import { waitForEnd } from './processes';
import { EXPO } from './webExport';

const ROOT = path.resolve(__dirname, '../..');
const TSX = require.resolve('tsx/cli');

/**
 * `npm run dev`: the client from the bundler with hot reload on PORT (8081), which hands /api to a server that starts anew
 * when its sources change. Its data are its own (`.data/dev`).
 */
export const develop = (): Promise<void> => withCleanup(dev, explain);

async function dev(cleanup: Cleanup): Promise<void> {
  const dataDir = path.resolve(ROOT, process.env.DATA_DIR ?? '.data/dev');
  const port = Number(process.env.PORT ?? 8081);
  await refuseBusyPort(port, '127.0.0.1');
  cleanup.add(claimDataDirectory(dataDir));
  const databaseUrl = await prepareDatabase(dataDir, process.env.DATABASE_URL, cleanup);
  const apiPort = await freePort();
  const publicUrl = process.env.PUBLIC_URL ?? `http://localhost:${port}`;
  run(cleanup, [TSX, 'watch', '--clear-screen=false', 'server/index.ts'], {
    DATABASE_URL: databaseUrl,
    DATA_DIR: dataDir,
    DEMO_DATA: process.env.DEMO_DATA ?? 'yes',
    HOST: '127.0.0.1',
    PORT: String(apiPort),
    PUBLIC_URL: publicUrl,
  });
  run(cleanup, [EXPO, 'start', '--web', '--port', String(port)], {
    SPATE_API_PORT: String(apiPort),
    EXPO_OFFLINE: '1',
    EXPO_NO_TELEMETRY: '1',
    BROWSER: 'none',
  });
  console.log(
    `\nThe client is at ${publicUrl}, the API behind it. Ctrl-C stops both and the database.`,
  );
}

/** In a process group of its own, so that what it starts ends with it. */
function run(cleanup: Cleanup, args: string[], env: Record<string, string>): void {
  const child = spawn(process.execPath, args, {
    cwd: ROOT,
    env: { ...process.env, ...env },
    stdio: ['ignore', 'inherit', 'inherit'],
    detached: true,
  });
  const { pid } = child;
  if (!pid) throw new Error(`${args[0]} could not be started.`);
  let stopping = false;
  child.once('exit', (code) => {
    if (code && !stopping)
      console.error(`${path.basename(args[0]!)} ended with ${code}; Ctrl-C and start again.`);
  });
  cleanup.add(async () => {
    stopping = true;
    for (const signal of ['SIGTERM', 'SIGKILL'] as const) {
      try {
        process.kill(-pid, signal);
      } catch {
        return;
      }
      if (await waitForEnd(pid, 10)) return;
    }
  });
}
