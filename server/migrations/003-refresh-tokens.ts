import { DataTypes } from 'sequelize';
import { addIndex, id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = async ({ context }) => {
  await context.createTable('refresh_tokens', {
    id,
    user_id: reference('users', { onDelete: 'CASCADE' }),
    family: { type: DataTypes.CHAR(36), allowNull: false },
    token_hash: { type: DataTypes.CHAR(64), allowNull: false, unique: true },
    used_at: DataTypes.DATE(3),
    revoked_at: DataTypes.DATE(3),
    expires_at: { type: DataTypes.DATE(3), allowNull: false },
    created_at: timestamps['created_at']!,
  });
  // Looked up with each request.
  await addIndex(context, 'refresh_tokens', ['family']);
};

export const down: Step = ({ context }) => context.dropTable('refresh_tokens');
