import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = async ({ context }) => {
  await context.createTable('study_members', {
    id,
    study_id: reference('studies', { onDelete: 'CASCADE' }),
    user_id: reference('users', { onDelete: 'CASCADE' }),
    as: { type: DataTypes.STRING(16), allowNull: false },
    created_at: timestamps['created_at']!,
  });
  await context.sequelize.query(
    'CREATE UNIQUE INDEX IF NOT EXISTS study_members_study_id_user_id ON study_members (study_id, user_id)',
  );
};

export const down: Step = ({ context }) => context.dropTable('study_members');
