import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('one_time_tokens', {
    id,
    kind: { type: DataTypes.STRING(20), allowNull: false },
    token_hash: { type: DataTypes.CHAR(64), allowNull: false, unique: true },
    user_id: reference('users', { allowNull: true, onDelete: 'CASCADE' }),
    invitation_id: reference('invitations', { allowNull: true, onDelete: 'CASCADE' }),
    expires_at: { type: DataTypes.DATE(3), allowNull: false },
    used_at: DataTypes.DATE(3),
    created_at: timestamps['created_at']!,
  });

export const down: Step = ({ context }) => context.dropTable('one_time_tokens');
