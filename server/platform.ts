import pino, { type Logger } from 'pino';
import type { Sequelize } from 'sequelize';
import { buildAudit, type Audit } from './audit/buildAudit';
import { connect } from './database/connect';
import type { Env } from './env';
import { defineModels, type Models } from './models';

/** What every service stands on. Services take it (or part of it) as their first argument. */
export interface Platform {
  env: Env;
  log: Logger;
  sequelize: Sequelize;
  models: Models;
  audit: Audit;
  /** Now; tests move it. */
  now: () => Date;
  /** Runs at the end, latest first; whoever starts something that must be stopped adds to it. */
  onClose: (stop: () => Promise<void> | void) => void;
}

export interface Overrides {
  now?: () => Date;
}

export function buildPlatform(env: Env, overrides: Overrides = {}) {
  const log = pino({ level: env.logLevel, base: null });
  const sequelize = connect(env.databaseUrl, log);
  const stops: (() => Promise<void> | void)[] = [() => sequelize.close()];
  const models = defineModels(sequelize);
  const now = overrides.now ?? (() => new Date());
  const platform: Platform = {
    env,
    log,
    sequelize,
    models,
    audit: buildAudit(sequelize, models, now),
    now,
    onClose: (stop) => void stops.push(stop),
  };
  const close = async () => {
    for (const stop of stops.splice(0).reverse()) await stop();
  };
  return { platform, close };
}
