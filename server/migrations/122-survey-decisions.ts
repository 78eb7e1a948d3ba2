import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

/** What became of a revision that was handed in; the newest row of a revision holds. */
export const up: Step = ({ context }) =>
  context.createTable('survey_decisions', {
    id,
    survey_revision_id: reference('survey_revisions', { onDelete: 'CASCADE' }),
    decision: { type: DataTypes.STRING(16), allowNull: false },
    remarks: { type: DataTypes.TEXT, allowNull: false },
    decided_by: reference('users'),
    decided_at: { type: DataTypes.DATE(3), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('survey_decisions');
