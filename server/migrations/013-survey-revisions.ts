import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

export const up: Step = async ({ context }) => {
  await context.createTable('survey_revisions', {
    id,
    study_id: reference('studies'),
    revision: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    file_name: { type: DataTypes.STRING(255), allowNull: false },
    file_hash: { type: DataTypes.CHAR(64), allowNull: false },
    file: { type: DataTypes.BLOB('long'), allowNull: false },
    sections: { type: DataTypes.BLOB('long'), allowNull: false },
    note: { type: DataTypes.TEXT, allowNull: false },
    section_count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    point_count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    first_chainage: { type: DataTypes.DOUBLE, allowNull: false },
    last_chainage: { type: DataTypes.DOUBLE, allowNull: false },
    sent_by: reference('users'),
    sent_at: { type: DataTypes.DATE(3), allowNull: false },
  });
  // Two that arrive at once cannot take one number.
  await context.sequelize.query(
    'CREATE UNIQUE INDEX IF NOT EXISTS survey_revisions_study_id_revision ON survey_revisions (study_id, revision)',
  );
};

export const down: Step = ({ context }) => context.dropTable('survey_revisions');
