import type { Step } from '../database/columns';

/** What a long task has found so far, so that another attempt can go on from there. */
export const up: Step = ({ context }) =>
  context.sequelize.query(
    'ALTER TABLE tasks ADD COLUMN IF NOT EXISTS notes LONGBLOB NULL AFTER result',
  );

export const down: Step = ({ context }) =>
  context.sequelize.query('ALTER TABLE tasks DROP COLUMN IF EXISTS notes');
