import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import { jsonColumn } from '../database/jsonColumn';
import type { UserModel } from './User';

/** What was done to a reach to make one of its versions. */
export interface ReachChangeModel extends Model<
  InferAttributes<ReachChangeModel>,
  InferCreationAttributes<ReachChangeModel>
> {
  id: CreationOptional<number>;
  reachId: number;
  /** The version that it made. */
  version: number;
  /** What differs, told from the sections themselves. */
  words: string;
  /** What the modeller did, step by step. */
  steps: string[];
  changedBy: number;
  changedAt: Date;
  changer?: NonAttribute<UserModel>;
}

export const defineReachChange = (sequelize: Sequelize) =>
  sequelize.define<ReachChangeModel>(
    'ReachChange',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      reachId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      words: { type: DataTypes.TEXT, allowNull: false },
      steps: jsonColumn<string[]>('steps'),
      changedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      changedAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'reach_changes', timestamps: false },
  );
