import type { Step } from '../database/columns';

/** The reach that a working geometry was copied from; null for the one that was made with its survey revision. */
export const up: Step = async ({ context: { sequelize } }) => {
  await sequelize.query(
    'ALTER TABLE reaches ADD COLUMN IF NOT EXISTS copied_from BIGINT UNSIGNED NULL',
  );
  await sequelize.query(
    `ALTER TABLE reaches ADD CONSTRAINT FOREIGN KEY IF NOT EXISTS reaches_copied_from (copied_from)
     REFERENCES reaches (id) ON DELETE RESTRICT`,
  );
};

export const down: Step = async ({ context: { sequelize } }) => {
  await sequelize.query('ALTER TABLE reaches DROP FOREIGN KEY IF EXISTS reaches_copied_from');
  await sequelize.query('ALTER TABLE reaches DROP COLUMN IF EXISTS copied_from');
};
