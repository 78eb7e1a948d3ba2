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
import type { ReviewPointModel } from './ReviewPoint';
import type { RunModel } from './Run';
import type { UserModel } from './User';

/** The checking of a run, up to its signature. */
export interface ReviewModel extends Model<
  InferAttributes<ReviewModel>,
  InferCreationAttributes<ReviewModel>
> {
  id: CreationOptional<number>;
  runId: number;
  /** `draft`: answers were written, nothing was sent. */
  state: 'draft' | 'inCheck' | 'returned';
  sentBy: number | null;
  /** Whom the modeller asked; null: any senior engineer of the firm. */
  sentTo: number | null;
  sentAt: Date | null;
  method: string;
  assumptions: string;
  limits: string;
  /** Words of the modeller by item of the checklist. */
  answers: Record<string, string>;
  returnReason: string | null;
  outletProbeRunId: number | null;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
  run?: NonAttribute<RunModel>;
  sender?: NonAttribute<UserModel>;
  recipient?: NonAttribute<UserModel | null>;
  points?: NonAttribute<ReviewPointModel[]>;
  outletProbe?: NonAttribute<RunModel | null>;
}

export const defineReview = (sequelize: Sequelize) =>
  sequelize.define<ReviewModel>(
    'Review',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      runId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      state: { type: DataTypes.STRING(16), allowNull: false },
      sentBy: DataTypes.BIGINT.UNSIGNED,
      sentTo: DataTypes.BIGINT.UNSIGNED,
      sentAt: DataTypes.DATE(3),
      method: { type: DataTypes.TEXT, allowNull: false },
      assumptions: { type: DataTypes.TEXT, allowNull: false },
      limits: { type: DataTypes.TEXT, allowNull: false },
      answers: jsonColumn<Record<string, string>>('answers'),
      returnReason: DataTypes.TEXT,
      outletProbeRunId: DataTypes.BIGINT.UNSIGNED,
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'reviews' },
  );
