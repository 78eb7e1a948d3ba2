import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('stations', {
    id,
    study_id: reference('studies', { onDelete: 'CASCADE' }),
    name: { type: DataTypes.STRING(120), allowNull: false },
    chainage: { type: DataTypes.DOUBLE, allowNull: false },
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('stations');
