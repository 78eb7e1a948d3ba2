import { readdirSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import { QueryTypes, type QueryInterface, type Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import type { Step } from './columns';

/** The database was last used by a later version of the product. */
export class NewerSchemaError extends Error {
  constructor(readonly unknown: string[]) {
    super(
      `The database was written by a newer version of Spate (it has ${unknown.join(', ')}). ` +
        'Start that version, or use another data directory; nothing was changed.',
    );
    this.name = 'NewerSchemaError';
  }
}

const STEPS = path.resolve(__dirname, '../migrations');
// `import()` of a name made at run time would pass by what compiles TypeScript as it is required.
const requireStep = createRequire(__filename);
const STEP_FILE = /^(\d{3}-[a-z0-9-]+)\.[jt]s$/;

const storageOf = (sequelize: Sequelize) =>
  new SequelizeStorage({ sequelize, tableName: 'schema_steps' });

export function migrator(sequelize: Sequelize): Umzug<QueryInterface> {
  const migrations = readdirSync(STEPS)
    .filter((file) => STEP_FILE.test(file))
    .sort()
    .map((file) => {
      const load = () => requireStep(path.join(STEPS, file)) as { up: Step; down: Step };
      return {
        name: file.replace(STEP_FILE, '$1'),
        up: (params: { context: QueryInterface }) => load().up(params),
        down: (params: { context: QueryInterface }) => load().down(params),
      };
    });
  return new Umzug<QueryInterface>({
    migrations,
    context: sequelize.getQueryInterface(),
    storage: storageOf(sequelize),
    logger: undefined,
  });
}

/**
 * Brings the schema up to this version, one server at a time. Throws `NewerSchemaError` before touching anything
 * where the database knows steps that this version does not.
 */
export async function migrate(sequelize: Sequelize): Promise<string[]> {
  const steps = migrator(sequelize);
  // A named lock belongs to a connection: the transaction holds one fast meanwhile.
  return sequelize.transaction(async (transaction) => {
    const select = { transaction, type: QueryTypes.SELECT } as const;
    await sequelize.query("SELECT GET_LOCK('spate-migrate', 120)", select);
    try {
      const known = new Set(
        (await steps.migrations(sequelize.getQueryInterface())).map((step) => step.name),
      );
      // Asked of the table itself: Umzug answers only the steps that it knows.
      const executed = await storageOf(sequelize).executed();
      const unknown = executed.filter((name) => !known.has(name));
      if (unknown.length > 0) throw new NewerSchemaError(unknown);
      return (await steps.up()).map((step) => step.name);
    } finally {
      await sequelize.query("SELECT RELEASE_LOCK('spate-migrate')", select);
    }
  });
}
