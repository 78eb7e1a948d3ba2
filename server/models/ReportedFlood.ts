import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** The observed flood that the report of a run compares it with. */
export interface ReportedFloodModel extends Model<
  InferAttributes<ReportedFloodModel>,
  InferCreationAttributes<ReportedFloodModel>
> {
  runId: number;
  flood: string;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

export const defineReportedFlood = (sequelize: Sequelize) =>
  sequelize.define<ReportedFloodModel>(
    'ReportedFlood',
    {
      runId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true },
      flood: { type: DataTypes.STRING(120), allowNull: false },
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'reported_floods' },
  );
