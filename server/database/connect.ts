import { Sequelize } from 'sequelize';
import type { Logger } from 'pino';

/** One pool of connections. Times are UTC, names snake_case in the tables and camelCase in the code.
 *  Raw SELECTs must say `type: QueryTypes.SELECT`: without it Sequelize stumbles over this driver's rows. */
export const connect = (databaseUrl: string, log?: Logger): Sequelize =>
  new Sequelize(databaseUrl.replace(/^mysql:/, 'mariadb:'), {
    dialect: 'mariadb',
    timezone: '+00:00',
    logging: log ? (sql) => log.trace({ sql }, 'query') : false,
    pool: { max: 10, idle: 10_000, acquire: 20_000 },
    define: { underscored: true, charset: 'utf8mb4', collate: 'utf8mb4_unicode_ci' },
    dialectOptions: { connectTimeout: 10_000, maxAllowedPacket: 64 * 1024 * 1024 },
  });
