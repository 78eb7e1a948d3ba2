import { addIndex, type Step } from '../database/columns';

/** Counting and claiming read no blob; recovery looks for leases that ran out. */
export const up: Step = async ({ context }) => {
  await context.sequelize.query(
    'CREATE UNIQUE INDEX IF NOT EXISTS tasks_place ON tasks (set_id, position)',
  );
  await addIndex(context, 'tasks', ['set_id', 'state', 'position', 'progress']);
  await addIndex(context, 'tasks', ['state', 'lease_until']);
};

/** They go with the table. */
export const down: Step = async () => {};
