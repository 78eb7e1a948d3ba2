import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('review_points', {
    id,
    review_id: reference('reviews'),
    chainage: DataTypes.DOUBLE,
    time: DataTypes.DOUBLE,
    text: { type: DataTypes.TEXT, allowNull: false },
    state: { type: DataTypes.STRING(16), allowNull: false },
    raised_by: reference('users'),
    raised_at: { type: DataTypes.DATE(3), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('review_points');
