import path from 'node:path';
import { socketPath } from './socketPath';

/** What a database server keeps in its directory. */
export interface Files {
  data: string;
  socket: string;
  pid: string;
  log: string;
  /** For temporary tables. Its own: a server that starts clears away what looks like one in its directory. */
  tmp: string;
}

export const filesOf = (dir: string): Files => ({
  data: path.join(dir, 'mysql'),
  socket: socketPath(dir),
  pid: path.join(dir, 'mysql.pid'),
  log: path.join(dir, 'mysql.log'),
  tmp: path.join(dir, 'mysql.tmp'),
});

/** MariaDB refuses to run as root unless it is told to. */
export const asRoot = (): string[] => (process.getuid?.() === 0 ? ['--user=root'] : []);
