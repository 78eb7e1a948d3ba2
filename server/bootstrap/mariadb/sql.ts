import { spawnSync } from 'node:child_process';
import { program } from './program';

/** Runs SQL over the socket as the administrator; answers rows, columns set apart by tabs. Throws what MariaDB says. */
export function runSql(socket: string, statement: string): string {
  const done = spawnSync(
    program('mariadb'),
    ['--no-defaults', '--batch', '--skip-column-names', '--connect-timeout=5', '-S', socket],
    { input: statement, encoding: 'utf8' },
  );
  if (done.status !== 0) throw new Error(done.stderr.trim());
  return done.stdout.trim();
}

/** As a literal between quotes. */
export const quoted = (text: string): string => `'${text.replaceAll(/[\\']/g, '\\$&')}'`;
