import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { UserModel } from './User';

/** A signature that no longer stands, and why. The signature itself is kept. */
export interface WithdrawalModel extends Model<
  InferAttributes<WithdrawalModel>,
  InferCreationAttributes<WithdrawalModel>
> {
  id: CreationOptional<number>;
  runId: number;
  withdrawnBy: number;
  at: Date;
  reason: string;
  withdrawer?: NonAttribute<UserModel>;
}

export const defineWithdrawal = (sequelize: Sequelize) =>
  sequelize.define<WithdrawalModel>(
    'Withdrawal',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      runId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      withdrawnBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
      reason: { type: DataTypes.TEXT, allowNull: false },
    },
    { tableName: 'withdrawals', timestamps: false },
  );
