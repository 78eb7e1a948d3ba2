import type { Step } from '../database/columns';

/** Before there were decisions, what was handed in was accepted with it. */
export const up: Step = ({ context }) =>
  context.sequelize.query(
    `INSERT INTO survey_decisions (survey_revision_id, decision, remarks, decided_by, decided_at)
     SELECT r.id, 'accepted', '', r.sent_by, r.sent_at FROM survey_revisions r
     WHERE NOT EXISTS (SELECT 1 FROM survey_decisions d WHERE d.survey_revision_id = r.id)`,
  );

/** The rows go with their table. */
export const down: Step = () => Promise.resolve();
