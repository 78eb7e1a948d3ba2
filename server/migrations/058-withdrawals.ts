import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('withdrawals', {
    id,
    run_id: { ...reference('runs'), unique: true },
    withdrawn_by: reference('users'),
    at: { type: DataTypes.DATE(3), allowNull: false },
    reason: { type: DataTypes.TEXT, allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('withdrawals');
