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
import { jsonColumn } from '../database/jsonColumn';
import type { FirmModel } from './Firm';
import type { UserModel } from './User';

/** An account that is offered to an address. */
export interface InvitationModel extends Model<
  InferAttributes<InvitationModel>,
  InferCreationAttributes<InvitationModel>
> {
  id: CreationOptional<number>;
  firmId: number;
  email: string;
  roles: Role[];
  studyId: CreationOptional<number | null>;
  invitedById: number;
  expiresAt: Date;
  acceptedAt: CreationOptional<Date | null>;
  withdrawnAt: CreationOptional<Date | null>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
  firm?: NonAttribute<FirmModel>;
  invitedBy?: NonAttribute<UserModel>;
}

export const defineInvitation = (sequelize: Sequelize) =>
  sequelize.define<InvitationModel>(
    'Invitation',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      firmId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      email: { type: DataTypes.STRING(254), allowNull: false },
      roles: jsonColumn<Role[]>('roles'),
      studyId: DataTypes.BIGINT.UNSIGNED,
      invitedById: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
      acceptedAt: DataTypes.DATE(3),
      withdrawnAt: DataTypes.DATE(3),
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'invitations' },
  );
