import { spawnSync } from 'node:child_process';
import { renameSync, rmSync } from 'node:fs';
import os from 'node:os';
import { BootstrapError } from '../BootstrapError';
import { asRoot, type Files } from './files';
import { program } from './program';

/** Makes an empty data directory whose administrator is the owner of this process, known by the socket. */
export function initialise({ data, tmp }: Files): void {
  const unfinished = `${data}.new`;
  rmSync(unfinished, { recursive: true, force: true });
  const made = spawnSync(
    program('mariadb-install-db'),
    [
      '--no-defaults',
      ...asRoot(),
      `--datadir=${unfinished}`,
      '--auth-root-authentication-method=socket',
      `--auth-root-socket-user=${os.userInfo().username}`,
      '--skip-test-db',
    ],
    { encoding: 'utf8', env: { ...process.env, TMPDIR: tmp } },
  );
  if (made.status !== 0)
    throw new BootstrapError(
      `The database could not be made in ${data}:\n${`${made.stderr}${made.stdout}`.trim()}`,
    );
  // Only a finished one gets the name: after a start that was cut short the next begins anew.
  renameSync(unfinished, data);
}
