import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('marks', {
    id,
    study_id: reference('studies', { onDelete: 'CASCADE' }),
    chainage: { type: DataTypes.DOUBLE, allowNull: false },
    level: { type: DataTypes.DOUBLE, allowNull: false },
    kind: { type: DataTypes.STRING(20), allowNull: false },
    confidence: { type: DataTypes.STRING(10), allowNull: false },
    flood: { type: DataTypes.STRING(120), allowNull: false },
    observed_on: DataTypes.DATEONLY,
    note: { type: DataTypes.TEXT, allowNull: false },
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('marks');
