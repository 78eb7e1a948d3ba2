import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

/** What was done to a reach, version by version. */
export const up: Step = ({ context }) =>
  context.createTable('reach_changes', {
    id,
    reach_id: reference('reaches', { onDelete: 'CASCADE' }),
    version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    words: { type: DataTypes.TEXT, allowNull: false },
    steps: { type: DataTypes.TEXT('long'), allowNull: false },
    changed_by: reference('users'),
    changed_at: { type: DataTypes.DATE(3), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('reach_changes');
