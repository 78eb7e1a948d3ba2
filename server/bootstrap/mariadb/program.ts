import { accessSync, constants } from 'node:fs';
import path from 'node:path';
import { BootstrapError } from '../BootstrapError';

/** Where servers are kept; an ordinary user's PATH leaves them out. */
const MORE = ['/usr/local/sbin', '/usr/sbin', '/sbin'];

/** Full path of a program, or null where it is not installed. */
export function findProgram(name: string, searchPath = process.env.PATH ?? ''): string | null {
  for (const dir of [...searchPath.split(path.delimiter).filter(Boolean), ...MORE]) {
    const file = path.join(dir, name);
    try {
      accessSync(file, constants.X_OK);
      return file;
    } catch {
      continue;
    }
  }
  return null;
}

/** The same for a program of MariaDB; throws `BootstrapError` where it is missing. */
export function program(name: string): string {
  const found = findProgram(name);
  if (found) return found;
  throw new BootstrapError(
    `MariaDB is missing (${name}). On Debian install it with: apt-get install mariadb-server\n` +
      'Or name a database server of yours in DATABASE_URL.',
  );
}
