import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { RunModel } from './Run';

/** A signature: by whom, under which words, over what. It never changes. */
export interface SignOffModel extends Model<
  InferAttributes<SignOffModel>,
  InferCreationAttributes<SignOffModel>
> {
  id: CreationOptional<number>;
  runId: number;
  reviewId: number;
  signedBy: number;
  signerName: string;
  qualification: string;
  registrationNumber: string;
  statement: string;
  at: Date;
  caseHash: string;
  solverVersion: string;
  /** Sixteen signs without hyphens. */
  verificationCode: string;
  /** The signed run of the same scenario that this one replaces. */
  supersedesRunId: number | null;
  /** gzip of JSON, `SignedRecord`. Left out of the default scope. */
  record: CreationOptional<Buffer>;
  run?: NonAttribute<RunModel>;
}

export const defineSignOff = (sequelize: Sequelize) =>
  sequelize.define<SignOffModel>(
    'SignOff',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      runId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      reviewId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      signedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      signerName: { type: DataTypes.STRING(120), allowNull: false },
      qualification: { type: DataTypes.STRING(120), allowNull: false },
      registrationNumber: { type: DataTypes.STRING(120), allowNull: false },
      statement: { type: DataTypes.TEXT, allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
      caseHash: { type: DataTypes.STRING(80), allowNull: false },
      solverVersion: { type: DataTypes.STRING(20), allowNull: false },
      verificationCode: { type: DataTypes.CHAR(16), allowNull: false },
      supersedesRunId: DataTypes.BIGINT.UNSIGNED,
      record: { type: DataTypes.BLOB('long'), allowNull: false },
    },
    {
      tableName: 'sign_offs',
      timestamps: false,
      defaultScope: { attributes: { exclude: ['record'] } },
      scopes: { withRecord: {} },
    },
  );
