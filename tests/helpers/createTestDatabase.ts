import { randomBytes } from 'node:crypto';
import { createConnection } from 'mariadb';

/** A fresh database on the tests' server. */
export async function createTestDatabase(): Promise<{ url: string; drop: () => Promise<void> }> {
  const server = process.env.SPATE_TEST_DATABASE;
  if (!server) throw new Error('No test database: the project needs databaseSetup.ts.');
  const name = `spate_test_${randomBytes(6).toString('hex')}`;
  await runOn(server, `CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  return { url: server + name, drop: () => runOn(server, `DROP DATABASE ${name}`) };
}

async function runOn(server: string, statement: string): Promise<void> {
  const { hostname, port, username, password } = new URL(server);
  const connection = await createConnection({
    host: hostname,
    port: Number(port),
    user: username,
    password: decodeURIComponent(password),
  });
  try {
    await connection.query(statement);
  } finally {
    await connection.end();
  }
}
