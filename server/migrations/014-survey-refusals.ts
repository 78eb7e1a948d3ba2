import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('survey_refusals', {
    id,
    study_id: reference('studies'),
    file_name: { type: DataTypes.STRING(255), allowNull: false },
    fault_count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    faults: { type: DataTypes.TEXT('long'), allowNull: false },
    sent_by: reference('users'),
    sent_at: { type: DataTypes.DATE(3), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('survey_refusals');
