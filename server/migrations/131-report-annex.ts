import type { Step } from '../database/columns';

/** A report is kept with and without the annex of published cases: each is a file of its own. */
export const up: Step = ({ context }) =>
  context.sequelize.query(
    `ALTER TABLE reports ADD COLUMN IF NOT EXISTS annex TINYINT(1) NOT NULL DEFAULT 0 AFTER paper,
     ADD UNIQUE INDEX IF NOT EXISTS reports_each (run_id, standing, paper, annex),
     DROP INDEX IF EXISTS reports_once`,
  );

/** Refused by the database where reports with an annex are kept: they must not be lost. */
export const down: Step = ({ context }) =>
  context.sequelize.query(
    `ALTER TABLE reports ADD UNIQUE INDEX IF NOT EXISTS reports_once (run_id, standing, paper),
     DROP INDEX IF EXISTS reports_each, DROP COLUMN IF EXISTS annex`,
  );
