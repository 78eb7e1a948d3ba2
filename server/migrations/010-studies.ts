import { DataTypes } from 'sequelize';
import { addIndex, id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = async ({ context }) => {
  await context.createTable('studies', {
    id,
    firm_id: reference('firms'),
    title: { type: DataTypes.STRING(120), allowNull: false },
    client_name: { type: DataTypes.STRING(120), allowNull: false },
    place: { type: DataTypes.STRING(120), allowNull: false },
    vertical_datum: { type: DataTypes.STRING(120), allowNull: false },
    unit_system: { type: DataTypes.STRING(16), allowNull: false },
    purpose: { type: DataTypes.TEXT, allowNull: false },
    created_by: reference('users'),
    ...timestamps,
  });
  await addIndex(context, 'studies', ['firm_id', 'updated_at']);
};

export const down: Step = ({ context }) => context.dropTable('studies');
