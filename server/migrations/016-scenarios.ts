import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('scenarios', {
    id,
    study_id: reference('studies'),
    reach_id: reference('reaches'),
    name: { type: DataTypes.STRING(120), allowNull: false },
    body: { type: DataTypes.TEXT('long'), allowNull: false },
    peak_inflow: DataTypes.DOUBLE,
    fault_count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 1 },
    updated_by: reference('users'),
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('scenarios');
