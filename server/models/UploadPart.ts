import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** A stretch of a file that is on its way in. */
export interface UploadPartModel extends Model<
  InferAttributes<UploadPartModel>,
  InferCreationAttributes<UploadPartModel>
> {
  uploadId: number;
  /** Of its first byte in the file. */
  place: number;
  bytes: Buffer;
}

export const defineUploadPart = (sequelize: Sequelize) =>
  sequelize.define<UploadPartModel>(
    'UploadPart',
    {
      uploadId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true },
      place: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      bytes: { type: DataTypes.BLOB('long'), allowNull: false },
    },
    { tableName: 'upload_parts', timestamps: false },
  );
