import type { startDatabase } from './startDatabase';

/** Address of the product's schema on a server of our own; made where it is not there yet. */
export function ownSchema(database: Awaited<ReturnType<typeof startDatabase>>): string {
  database.sql(
    'CREATE DATABASE IF NOT EXISTS spate CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci',
  );
  return database.url('spate');
}
