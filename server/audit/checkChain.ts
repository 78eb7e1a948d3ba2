import { withCleanup } from '../bootstrap/cleanup';
import { commandEnv } from '../bootstrap/commandEnv';
import { explain } from '../bootstrap/explain';
import { connect } from '../database/connect';
import { defineModels } from '../models';
import { verifyChain } from './verifyChain';

/** `npm run audit:check`: says whether the audit trail holds; ends with 1 where it does not. The product may run meanwhile. */
void withCleanup(async (cleanup) => {
  const { databaseUrl } = await commandEnv(cleanup);
  const sequelize = connect(databaseUrl);
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
