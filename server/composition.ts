import { buildPassport } from './auth/passport';
import { buildSessions } from './auth/sessions';
import { migrate } from './database/migrate';
import type { Env } from './env';
import { authenticateWith } from './middleware/authenticate';
import { buildPlatform, type Overrides } from './platform';

/** The only constructor of dependencies: connects, brings the schema up to date, and builds every service once. */
export async function compose(env: Env, overrides: Overrides = {}) {
  const { platform, close } = buildPlatform(env, overrides);
  try {
    await migrate(platform.sequelize);
    return {
      ...platform,
      close,
      authenticate: authenticateWith(buildPassport(platform)),
      sessions: buildSessions(platform),
    };
  } catch (error) {
    await close();
    throw error;
  }
}

export type Services = Awaited<ReturnType<typeof compose>>;
