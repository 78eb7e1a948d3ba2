import path from 'node:path';
import { withCleanup } from '../bootstrap/cleanup';
import { explain } from '../bootstrap/explain';
import { startDatabase } from '../bootstrap/mariadb/startDatabase';
import { connect } from '../database/connect';
import { readEnv } from '../env';
import { defineModels } from '../models';
import { verifyChain } from './verifyChain';

/** `npm run audit:check`: says whether the audit trail holds; ends with 1 where it does not. The product may run meanwhile. */
void withCleanup(async (cleanup) => {
  const given = process.env.DATABASE_URL;
  const env = readEnv({ ...process.env, DATABASE_URL: given ?? 'mariadb://none/none' });
  let url = given;
  if (!url) {
    const database = await startDatabase({
      dir: path.resolve(env.dataDir),
      password: env.secrets.databasePassword,
    });
    // Whoever runs already goes on.
    if (!database.adopted) cleanup.add(database.stop);
    url = database.url('spate');
  }
  const sequelize = connect(url);
  try {
    const report = await verifyChain(sequelize, defineModels(sequelize));
    if (report.holds)
      console.log(`The audit trail holds: ${report.rows} rows, each on the one before.`);
    else {
      console.error(
        report.brokenAt === null
          ? `The audit trail is broken: after ${report.rows} rows its end is missing.`
          : `The audit trail is broken at row ${report.brokenAt}: it does not follow from the ${report.rows} rows before it.`,
      );
      process.exitCode = 1;
    }
  } finally {
    await sequelize.close();
  }
  await cleanup.run();
}, explain);
