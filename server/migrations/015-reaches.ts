import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('reaches', {
    id,
    study_id: reference('studies'),
    survey_revision_id: reference('survey_revisions'),
    name: { type: DataTypes.STRING(120), allowNull: false },
    sections: { type: DataTypes.BLOB('long'), allowNull: false },
    section_count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    first_chainage: { type: DataTypes.DOUBLE, allowNull: false },
    last_chainage: { type: DataTypes.DOUBLE, allowNull: false },
    version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 1 },
    updated_by: reference('users'),
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('reaches');
