import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Role } from '../../shared/accounts/roles';
import type { FirmModel } from './Firm';
import { jsonColumn } from '../database/jsonColumn';

/** A person with an account in one firm. */
export interface UserModel extends Model<
  InferAttributes<UserModel>,
  InferCreationAttributes<UserModel>
> {
  id: CreationOptional<number>;
  firmId: number;
  /** Lower case; unique over all firms. */
  email: string;
  name: string;
  passwordHash: string;
  roles: Role[];
  active: CreationOptional<boolean>;
  /** Access tokens carry it; growing it ends all that were given out. */
  tokenVersion: CreationOptional<number>;
  qualification: CreationOptional<string | null>;
  registrationNumber: CreationOptional<string | null>;
  lastSignInAt: CreationOptional<Date | null>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
  firm?: NonAttribute<FirmModel>;
}

export const defineUser = (sequelize: Sequelize) =>
  sequelize.define<UserModel>(
    'User',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      firmId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      email: { type: DataTypes.STRING(254), allowNull: false },
      name: { type: DataTypes.STRING(120), allowNull: false },
      passwordHash: { type: DataTypes.STRING(255), allowNull: false },
      roles: jsonColumn<Role[]>('roles'),
      active: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
      tokenVersion: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 1 },
      qualification: DataTypes.STRING(120),
      registrationNumber: DataTypes.STRING(120),
      lastSignInAt: DataTypes.DATE(3),
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'users' },
  );
