import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('users', {
    id,
    firm_id: reference('firms'),
    email: { type: DataTypes.STRING(254), allowNull: false, unique: true },
    name: { type: DataTypes.STRING(120), allowNull: false },
    password_hash: { type: DataTypes.STRING(255), allowNull: false },
    roles: { type: DataTypes.TEXT('long'), allowNull: false },
    active: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    token_version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 1 },
    qualification: DataTypes.STRING(120),
    registration_number: DataTypes.STRING(120),
    last_sign_in_at: DataTypes.DATE(3),
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('users');
