import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';
import type { Paper, ReportRow } from '../../shared/reports/types';

/** A report that was made of a signature, to the byte. It never changes. */
export interface ReportModel extends Model<
  InferAttributes<ReportModel>,
  InferCreationAttributes<ReportModel>
> {
  id: CreationOptional<number>;
  runId: number;
  /** What is preliminary is made anew each time and not kept. */
  standing: Exclude<ReportRow['standing'], 'preliminary'>;
  paper: Paper;
  /** With the published cases as its last pages. */
  annex: CreationOptional<boolean>;
  /** SHA-256 of `pdf`, hex. */
  hash: string;
  bytes: number;
  pages: number;
  /** Large; left out of the default scope. */
  pdf: CreationOptional<Buffer>;
  createdAt: Date;
}

export const defineReport = (sequelize: Sequelize) =>
  sequelize.define<ReportModel>(
    'Report',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      runId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      standing: { type: DataTypes.STRING(16), allowNull: false },
      paper: { type: DataTypes.STRING(8), allowNull: false },
      annex: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      hash: { type: DataTypes.CHAR(64), allowNull: false },
      bytes: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      pages: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      pdf: { type: DataTypes.BLOB('long'), allowNull: false },
      createdAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    {
      tableName: 'reports',
      timestamps: false,
      defaultScope: { attributes: { exclude: ['pdf'] } },
      scopes: { withPdf: {} },
    },
  );
