import { mkdtempSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import os from 'node:os';
import path from 'node:path';
import supertest from 'supertest';
import { buildApp } from '../../server/app';
import { compose, type Services } from '../../server/composition';
import { readEnv } from '../../server/env';
import type { UserModel } from '../../server/models/User';
import type { Overrides } from '../../server/platform';
import { createTestDatabase } from './createTestDatabase';

// A real database and real hashes on a busy machine: a test that hangs is told from one that waits.
jest.setTimeout(60_000);

export interface TestServer {
  services: Services;
  /** Base address of a listening server, for what supertest does not speak (event streams). */
  url: string;
  request: ReturnType<typeof supertest>;
  /** A bearer token of a new session of the user. */
  tokenOf: (user: UserModel) => Promise<string>;
  /** Requests that carry such a token: `(await signInAs(user)).get('/api/me')`. */
  signInAs: (user: UserModel) => Promise<ReturnType<typeof supertest.agent>>;
  stop: () => Promise<void>;
}

/** The whole server on a fresh database: one a test file. `settings` are environment variables. */
export async function startTestServer(
  settings: Record<string, string> = {},
  overrides: Overrides = {},
): Promise<TestServer> {
  const database = await createTestDatabase();
  const dataDir = mkdtempSync(path.join(os.tmpdir(), 'spate-test-'));
  const env = readEnv({
    DATABASE_URL: database.url,
    DATA_DIR: dataDir,
    LOG_LEVEL: 'silent',
    ...settings,
  });
  const services = await compose(env, overrides);
  const server = await new Promise<Server>((resolve) => {
    const listening = buildApp(services).listen(0, '127.0.0.1', () => resolve(listening));
  });
  const { port } = server.address() as { port: number };

  const tokenOf = async (user: UserModel) => (await services.sessions.start(user)).accessToken;
  return {
    services,
    url: `http://127.0.0.1:${port}`,
    request: supertest(server),
    tokenOf,
    signInAs: async (user) =>
      supertest.agent(server).set('Authorization', `Bearer ${await tokenOf(user)}`),
    stop: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await services.close();
      await database.drop();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}
