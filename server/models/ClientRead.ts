import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { UserModel } from './User';

/** A client confirmed having read what was issued. */
export interface ClientReadModel extends Model<
  InferAttributes<ClientReadModel>,
  InferCreationAttributes<ClientReadModel>
> {
  runId: number;
  userId: number;
  at: Date;
  reader?: NonAttribute<UserModel>;
}

export const defineClientRead = (sequelize: Sequelize) =>
  sequelize.define<ClientReadModel>(
    'ClientRead',
    {
      runId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true },
      userId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true },
      at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'client_reads', timestamps: false },
  );
