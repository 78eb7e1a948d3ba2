import { DataTypes } from 'sequelize';
import { reference, type Step } from '../database/columns';

/** The bytes as they came, each part at its place in the file. */
export const up: Step = ({ context }) =>
  context.createTable('upload_parts', {
    upload_id: { ...reference('uploads', { onDelete: 'CASCADE' }), primaryKey: true },
    place: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, primaryKey: true },
    bytes: { type: DataTypes.BLOB('long'), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('upload_parts');
