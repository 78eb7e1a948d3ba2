import type { Step } from '../database/columns';

/** What the water is held against at a station: a short list that is always read whole. */
export const up: Step = ({ context }) =>
  context.sequelize.query('ALTER TABLE stations ADD COLUMN IF NOT EXISTS levels LONGTEXT NULL');

export const down: Step = ({ context }) =>
  context.sequelize.query('ALTER TABLE stations DROP COLUMN IF EXISTS levels');
