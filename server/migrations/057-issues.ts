import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('issues', {
    id,
    run_id: { ...reference('runs'), unique: true },
    issued_by: reference('users'),
    at: { type: DataTypes.DATE(3), allowNull: false },
    station_ids: { type: DataTypes.TEXT, allowNull: false },
    message: { type: DataTypes.TEXT, allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('issues');
