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

/** What was written on a point since it was raised. */
export interface ReviewPointEntryModel extends Model<
  InferAttributes<ReviewPointEntryModel>,
  InferCreationAttributes<ReviewPointEntryModel>
> {
  id: CreationOptional<number>;
  pointId: number;
  kind: 'answer' | 'closed' | 'reopened';
  text: string;
  writtenBy: number;
  at: Date;
  writer?: NonAttribute<UserModel>;
}

export const defineReviewPointEntry = (sequelize: Sequelize) =>
  sequelize.define<ReviewPointEntryModel>(
    'ReviewPointEntry',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      pointId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      kind: { type: DataTypes.STRING(16), allowNull: false },
      text: { type: DataTypes.TEXT, allowNull: false },
      writtenBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'review_point_entries', timestamps: false },
  );
