import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('uploads', {
    id,
    study_id: reference('studies', { onDelete: 'CASCADE' }),
    user_id: reference('users', { onDelete: 'CASCADE' }),
    file_name: { type: DataTypes.STRING(255), allowNull: false },
    size: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    received: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
    started_at: { type: DataTypes.DATE(3), allowNull: false },
    expires_at: { type: DataTypes.DATE(3), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('uploads');
