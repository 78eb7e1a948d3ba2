import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** One link of a chain: each refresh uses a token up and makes the next of the same family. */
export interface RefreshTokenModel extends Model<
  InferAttributes<RefreshTokenModel>,
  InferCreationAttributes<RefreshTokenModel>
> {
  id: CreationOptional<number>;
  userId: number;
  family: string;
  /** SHA-256, hex; the token itself is never stored. */
  tokenHash: string;
  usedAt: CreationOptional<Date | null>;
  revokedAt: CreationOptional<Date | null>;
  expiresAt: Date;
  createdAt: CreationOptional<Date>;
}

export const defineRefreshToken = (sequelize: Sequelize) =>
  sequelize.define<RefreshTokenModel>(
    'RefreshToken',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      userId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      family: { type: DataTypes.CHAR(36), allowNull: false },
      tokenHash: { type: DataTypes.CHAR(64), allowNull: false },
      usedAt: DataTypes.DATE(3),
      revokedAt: DataTypes.DATE(3),
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
      createdAt: DataTypes.DATE(3),
    },
    { tableName: 'refresh_tokens', updatedAt: false },
  );
