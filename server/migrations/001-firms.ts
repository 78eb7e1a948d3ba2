import { DataTypes } from 'sequelize';
import { id, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('firms', {
    id,
    name: { type: DataTypes.STRING(120), allowNull: false },
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('firms');
