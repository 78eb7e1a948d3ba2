import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** Who did what, when, from where, to which record. Only ever added to; each row carries the hash of the one before. */
export interface AuditRowModel extends Model<
  InferAttributes<AuditRowModel>,
  InferCreationAttributes<AuditRowModel>
> {
  id: CreationOptional<number>;
  at: Date;
  firmId: number | null;
  actorId: number | null;
  actor: string | null;
  fromAddress: string | null;
  action: string;
  words: string;
  recordKind: string | null;
  recordId: number | null;
  outcome: 'done' | 'refused';
  hash: string;
}

export const defineAuditRow = (sequelize: Sequelize) =>
  sequelize.define<AuditRowModel>(
    'AuditRow',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      at: { type: DataTypes.DATE(3), allowNull: false },
      firmId: DataTypes.BIGINT.UNSIGNED,
      actorId: DataTypes.BIGINT.UNSIGNED,
      actor: DataTypes.STRING(254),
      fromAddress: DataTypes.STRING(64),
      action: { type: DataTypes.STRING(60), allowNull: false },
      words: { type: DataTypes.STRING(500), allowNull: false },
      recordKind: DataTypes.STRING(40),
      recordId: DataTypes.BIGINT.UNSIGNED,
      outcome: { type: DataTypes.STRING(10), allowNull: false },
      hash: { type: DataTypes.CHAR(64), allowNull: false },
    },
    { tableName: 'audit_rows', timestamps: false },
  );
