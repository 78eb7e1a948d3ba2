import { readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { filesOf } from './mariadb/files';
import { shutDown } from './mariadb/shutDown';
import { isAlive, readPid } from './processes';

/**
 * Stops and removes what tests left behind that were killed: databases `db-<process>`, and products `e2e-…` whose
 * process is gone without having given up its directory.
 */
export async function stopLeftDatabases(dir: string): Promise<void> {
  for (const name of readdirSync(dir)) {
    const left = path.join(dir, name);
    if (!isLeft(left)) continue;
    await shutDown(filesOf(left));
    rmSync(left, { recursive: true, force: true });
  }
}

function isLeft(dir: string): boolean {
  const name = path.basename(dir);
  const pid = name.startsWith('e2e-')
    ? readPid(path.join(dir, 'spate.pid'))
    : Number(/^db-(\d+)$/.exec(name)?.[1] ?? 0);
  return pid !== null && pid > 0 && !isAlive(pid);
}
