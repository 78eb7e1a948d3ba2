import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';
import { jsonColumn } from '../database/jsonColumn';

/** A signed run given to the clients of its study. */
export interface IssueModel extends Model<
  InferAttributes<IssueModel>,
  InferCreationAttributes<IssueModel>
> {
  id: CreationOptional<number>;
  runId: number;
  issuedBy: number;
  at: Date;
  /** What the client sees. */
  stationIds: number[];
  message: string;
}

export const defineIssue = (sequelize: Sequelize) =>
  sequelize.define<IssueModel>(
    'Issue',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      runId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      issuedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
      stationIds: jsonColumn<number[]>('stationIds'),
      message: { type: DataTypes.TEXT, allowNull: false },
    },
    { tableName: 'issues', timestamps: false },
  );
