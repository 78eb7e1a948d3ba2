import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** A file on its way in, part by part; it is read once it is whole, and forgotten when it was, or in a day. */
export interface UploadModel extends Model<
  InferAttributes<UploadModel>,
  InferCreationAttributes<UploadModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  userId: number;
  fileName: string;
  /** Bytes of the whole file. */
  size: number;
  /** Bytes that have arrived, from the beginning without a gap. */
  received: CreationOptional<number>;
  startedAt: Date;
  expiresAt: Date;
}

export const defineUpload = (sequelize: Sequelize) =>
  sequelize.define<UploadModel>(
    'Upload',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      userId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      fileName: { type: DataTypes.STRING(255), allowNull: false },
      size: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      received: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
      startedAt: { type: DataTypes.DATE(3), allowNull: false },
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'uploads', timestamps: false },
  );
