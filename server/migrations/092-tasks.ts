import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('tasks', {
    id,
    set_id: reference('task_sets', { onDelete: 'CASCADE' }),
    position: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    part: { type: DataTypes.STRING(16), allowNull: false },
    label: { type: DataTypes.STRING(160), allowNull: false },
    state: { type: DataTypes.STRING(16), allowNull: false },
    payload: { type: DataTypes.BLOB('long'), allowNull: false },
    result: DataTypes.BLOB('long'),
    progress: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 0 },
    attempts: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
    lease_owner: DataTypes.STRING(36),
    lease_until: DataTypes.DATE(3),
    interruption: DataTypes.STRING(500),
    failure: DataTypes.TEXT,
    started_at: DataTypes.DATE(3),
    finished_at: DataTypes.DATE(3),
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('tasks');
