import path from 'node:path';
import { readEnv, type Env } from '../env';
import type { Cleanup } from './cleanup';
import { ownSchema } from './mariadb/ownSchema';
import { startDatabase } from './mariadb/startDatabase';

/**
 * Settings for a command beside the product: its database as it runs, or started for the while and stopped in the end.
 */
export async function commandEnv(cleanup: Cleanup): Promise<Env> {
  const given = process.env.DATABASE_URL;
  const settings = (databaseUrl: string) => readEnv({ ...process.env, DATABASE_URL: databaseUrl });
  if (given) return settings(given);
  const env = settings('mariadb://none/none');
  const database = await startDatabase({
    dir: path.resolve(env.dataDir),
    password: env.secrets.databasePassword,
  });
  // Whoever runs already goes on.
  if (!database.adopted) cleanup.add(database.stop);
  return settings(ownSchema(database));
}
