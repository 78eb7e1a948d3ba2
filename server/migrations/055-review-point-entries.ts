import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('review_point_entries', {
    id,
    point_id: reference('review_points'),
    kind: { type: DataTypes.STRING(16), allowNull: false },
    text: { type: DataTypes.TEXT, allowNull: false },
    written_by: reference('users'),
    at: { type: DataTypes.DATE(3), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('review_point_entries');
