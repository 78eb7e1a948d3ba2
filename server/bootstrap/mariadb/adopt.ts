import { existsSync } from 'node:fs';
import path from 'node:path';
import { BootstrapError } from '../BootstrapError';
import { commandOf, isAlive, readPid, waitForEnd } from '../processes';
import type { Files } from './files';
import { runSql } from './sql';

/** Port of a server that works on this data directory and answers; null where none does. */
export async function adopt(files: Files): Promise<number | null> {
  const port = answeringPort(files);
  if (port !== null) return port;
  // A server that runs but cannot be reached holds the files: it is shut down as it should be.
  const pid = readPid(files.pid);
  if (pid === null || !isAlive(pid) || !commandOf(pid).includes(`--datadir=${files.data}`))
    return null;
  process.kill(pid, 'SIGTERM');
  if (!(await waitForEnd(pid, 60)))
    throw new BootstrapError(
      `A database server that works on ${files.data} (process ${pid}) does not answer and does not stop. Stop it and start again.`,
    );
  return null;
}

function answeringPort({ socket, data }: Files): number | null {
  if (!existsSync(socket)) return null;
  try {
    const [dir = '', port] = runSql(socket, 'SELECT @@datadir, @@port').split('\t');
    return path.resolve(dir) === path.resolve(data) ? Number(port) : null;
  } catch {
    return null;
  }
}
