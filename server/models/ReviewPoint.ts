import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { ReviewPointEntryModel } from './ReviewPointEntry';
import type { UserModel } from './User';

/** Something that the checker wants answered: on the run, on a place, or on a place at a time. */
export interface ReviewPointModel extends Model<
  InferAttributes<ReviewPointModel>,
  InferCreationAttributes<ReviewPointModel>
> {
  id: CreationOptional<number>;
  reviewId: number;
  /** m */
  chainage: number | null;
  /** s from start */
  time: number | null;
  text: string;
  state: 'open' | 'answered' | 'closed';
  raisedBy: number;
  raisedAt: Date;
  raiser?: NonAttribute<UserModel>;
  entries?: NonAttribute<ReviewPointEntryModel[]>;
}

export const defineReviewPoint = (sequelize: Sequelize) =>
  sequelize.define<ReviewPointModel>(
    'ReviewPoint',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      reviewId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      chainage: DataTypes.DOUBLE,
      time: DataTypes.DOUBLE,
      text: { type: DataTypes.TEXT, allowNull: false },
      state: { type: DataTypes.STRING(16), allowNull: false },
      raisedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      raisedAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'review_points', timestamps: false },
  );
