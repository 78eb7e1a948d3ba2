import { QueryTypes } from 'sequelize';
import { connect } from '../../../server/database/connect';
import { migrate, migrator } from '../../../server/database/migrate';
import { createTestDatabase } from '../../helpers/createTestDatabase';

jest.setTimeout(120_000);

test('every step can be run twice, undone and run again, and leaves the same schema', async () => {
  const database = await createTestDatabase();
  const sequelize = connect(database.url);
  const context = sequelize.getQueryInterface();
  const schema = async () => {
    const read = <R extends object>(sql: string) =>
      sequelize.query<R>(sql, { type: QueryTypes.SELECT });
    const columns = await read(
      `SELECT table_name, column_name, column_type, is_nullable FROM information_schema.columns
       WHERE table_schema = DATABASE() AND table_name <> 'schema_steps' ORDER BY 1, 2`,
    );
    const triggers = await read(
      `SELECT trigger_name, action_statement FROM information_schema.triggers
       WHERE trigger_schema = DATABASE() ORDER BY 1`,
    );
    return { columns, triggers };
  };
  try {
    const steps = await migrate(sequelize);
    const first = await schema();
    expect(first.triggers.length).toBeGreaterThan(20);
    // Broken off in the middle of a step: the step is not noted, and begins again.
    for (const step of await migrator(sequelize).migrations(context))
      await step.up({ name: step.name, context });
    expect(await schema()).toEqual(first);
    await migrator(sequelize).down({ to: 0 });
    expect(await schema()).toEqual({ columns: [], triggers: [] });
    expect(await migrate(sequelize)).toEqual(steps);
    expect(await schema()).toEqual(first);
  } finally {
    await sequelize.close();
    await database.drop();
  }
});
