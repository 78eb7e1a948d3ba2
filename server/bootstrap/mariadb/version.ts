import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { BootstrapError } from '../BootstrapError';
import type { Files } from './files';
import { program } from './program';

/** `10.11` of a text with a version of MariaDB in it, as [10, 11]; null where there is none. */
export function seriesOf(text: string): [number, number] | null {
  const found = /(\d+)\.(\d+)\.\d+-MariaDB/.exec(text);
  return found ? [Number(found[1]), Number(found[2])] : null;
}

/** Is the series before, the same, or after the other: negative, 0, positive. */
export const compareSeries = (a: [number, number], b: [number, number]): number =>
  a[0] - b[0] || a[1] - b[1];

function seriesOfData(data: string): [number, number] | null {
  for (const name of ['mariadb_upgrade_info', 'mysql_upgrade_info']) {
    try {
      return seriesOf(readFileSync(path.join(data, name), 'utf8'));
    } catch {
      continue;
    }
  }
  return null;
}

const seriesOfServer = (): [number, number] | null =>
  seriesOf(spawnSync(program('mariadbd'), ['--version'], { encoding: 'utf8' }).stdout);

/** Throws where the data was written by a later series of MariaDB than is installed: it could be spoilt. */
export function refuseNewerData({ data }: Files): void {
  const [written, installed] = [seriesOfData(data), seriesOfServer()];
  if (written && installed && compareSeries(written, installed) > 0)
    throw new BootstrapError(
      `${data} was written by MariaDB ${written.join('.')}, but ${installed.join('.')} is installed. ` +
        'Install that version or a later one, or use another data directory (DATA_DIR). Nothing was changed.',
    );
}

/** After a newer MariaDB was installed, brings its own tables up to date; the server must be running. */
export function upgradeData({ data, socket }: Files): void {
  const [written, installed] = [seriesOfData(data), seriesOfServer()];
  if (!written || !installed || compareSeries(written, installed) >= 0) return;
  const done = spawnSync(program('mariadb-upgrade'), ['--no-defaults', '-S', socket], {
    encoding: 'utf8',
  });
  if (done.status !== 0)
    throw new BootstrapError(`The database could not be upgraded:\n${done.stderr.trim()}`);
}
