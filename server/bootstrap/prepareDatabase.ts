import path from 'node:path';
import { connect } from '../database/connect';
import { migrate } from '../database/migrate';
import { readSecrets } from '../secrets';
import type { Cleanup } from './cleanup';
import { ensureDebianPackages } from './debianPackages';
import { ownSchema } from './mariadb/ownSchema';
import { startDatabase } from './mariadb/startDatabase';

/**
 * Address of a database that is up to date: the one of `DATABASE_URL`, or our own in the data directory, which is started
 * and will be stopped in the end.
 */
export async function prepareDatabase(
  dataDir: string,
  given: string | undefined,
  cleanup: Cleanup,
): Promise<string> {
  const url = given ?? (await startOwn(dataDir, cleanup));
  const sequelize = connect(url);
  try {
    await migrate(sequelize);
  } finally {
    await sequelize.close();
  }
  return url;
}

async function startOwn(dataDir: string, cleanup: Cleanup): Promise<string> {
  ensureDebianPackages(['mariadb-server']);
  const database = await cleanup.stopLater(
    startDatabase({
      dir: path.resolve(dataDir),
      password: readSecrets(dataDir).databasePassword,
    }),
  );
  return ownSchema(database);
}
