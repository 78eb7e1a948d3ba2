import { randomBytes } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { stopLeftDatabases } from '../../server/bootstrap/leftDatabases';
import { startDatabase, type OwnDatabase } from '../../server/bootstrap/mariadb/startDatabase';

export const TEST_DATA = path.resolve(__dirname, '../../.data-test');

declare global {
  var spateTestDatabase: { database: OwnDatabase; dir: string } | undefined;
}

/** One MariaDB server for a run of the tests, in a directory of its own: runs may go side by side. */
export default async function databaseSetup(): Promise<void> {
  mkdirSync(TEST_DATA, { recursive: true });
  await stopLeftDatabases(TEST_DATA);
  const dir = path.join(TEST_DATA, `db-${process.pid}`);
  const database = await startDatabase({
    dir,
    password: randomBytes(18).toString('base64url'),
    // Nothing here must outlive a power cut.
    args: [
      '--innodb-flush-log-at-trx-commit=0',
      '--innodb-flush-method=nosync',
      '--skip-innodb-doublewrite',
      '--skip-sync-frm',
    ],
  });
  globalThis.spateTestDatabase = { database, dir };
  process.env.SPATE_TEST_DATABASE = database.url('');
}
