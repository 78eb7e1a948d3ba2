import { spawn, type ChildProcess } from 'node:child_process';
import path from 'node:path';
import type { TestServer } from './testServer';

const ROOT = path.resolve(__dirname, '../..');

/** A real server process with one worker on the database of a test server. */
export function startServerProcess({ services }: TestServer): ChildProcess {
  const { databaseUrl, dataDir } = services.env;
  return spawn(process.execPath, ['--require', 'tsx/cjs', 'server/index.ts'], {
    cwd: ROOT,
    env: {
      PATH: process.env.PATH,
      DATABASE_URL: databaseUrl,
      DATA_DIR: dataDir,
      PORT: '0',
      WORKERS: '1',
      LOG_LEVEL: 'silent',
    },
    stdio: 'ignore',
  });
}

/** kill -9: nothing of the process gets a chance to tidy up. */
export async function killProcess(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const gone = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGKILL');
  await gone;
}
