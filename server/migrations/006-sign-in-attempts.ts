import { DataTypes } from 'sequelize';
import { addIndex, type Step } from '../database/columns';

export const up: Step = async ({ context }) => {
  await context.createTable('sign_in_attempts', {
    email_hash: { type: DataTypes.CHAR(64), primaryKey: true },
    count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    last_at: { type: DataTypes.DATE(3), allowNull: false },
    blocked_until: DataTypes.DATE(3),
  });
  await addIndex(context, 'sign_in_attempts', ['last_at']);
};

export const down: Step = ({ context }) => context.dropTable('sign_in_attempts');
