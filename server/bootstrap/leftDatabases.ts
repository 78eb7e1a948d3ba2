import { readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { filesOf } from './mariadb/files';
import { shutDown } from './mariadb/shutDown';
import { isAlive } from './processes';

/** Stops and removes databases of tests, `db-<process>`, whose process was killed. */
export async function stopLeftDatabases(dir: string): Promise<void> {
  for (const name of readdirSync(dir)) {
    const pid = Number(/^db-(\d+)$/.exec(name)?.[1]);
    if (!pid || isAlive(pid)) continue;
    const left = path.join(dir, name);
    await shutDown(filesOf(left));
    rmSync(left, { recursive: true, force: true });
  }
}
