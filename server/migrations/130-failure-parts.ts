import type { Step } from '../database/columns';

const TABLES = ['runs', 'tasks', 'task_sets'];

/** Quantities of the words why something failed, so that they can be told in the study's units. Older failures have none. */
export const up: Step = async ({ context }) => {
  for (const table of TABLES)
    await context.sequelize.query(
      `ALTER TABLE ${table} ADD COLUMN IF NOT EXISTS failure_parts LONGTEXT NULL AFTER failure`,
    );
};

export const down: Step = async ({ context }) => {
  for (const table of TABLES)
    await context.sequelize.query(`ALTER TABLE ${table} DROP COLUMN IF EXISTS failure_parts`);
};
