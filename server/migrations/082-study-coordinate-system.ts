import type { Step } from '../database/columns';

/** The name of what eastings and northings refer to; empty where nobody has named it. */
export const up: Step = ({ context }) =>
  context.sequelize.query(
    "ALTER TABLE studies ADD COLUMN IF NOT EXISTS coordinate_system VARCHAR(120) NOT NULL DEFAULT ''",
  );

export const down: Step = ({ context }) =>
  context.sequelize.query('ALTER TABLE studies DROP COLUMN IF EXISTS coordinate_system');
