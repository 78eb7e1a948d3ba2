import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

export type OneTimeTokenKind = 'reset' | 'invitation';

/** A link that works once. It is for a user (reset) or for an invitation. */
export interface OneTimeTokenModel extends Model<
  InferAttributes<OneTimeTokenModel>,
  InferCreationAttributes<OneTimeTokenModel>
> {
  id: CreationOptional<number>;
  kind: OneTimeTokenKind;
  /** SHA-256, hex. */
  tokenHash: string;
  userId: CreationOptional<number | null>;
  invitationId: CreationOptional<number | null>;
  expiresAt: Date;
  usedAt: CreationOptional<Date | null>;
  createdAt: CreationOptional<Date>;
}

export const defineOneTimeToken = (sequelize: Sequelize) =>
  sequelize.define<OneTimeTokenModel>(
    'OneTimeToken',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      kind: { type: DataTypes.STRING(20), allowNull: false },
      tokenHash: { type: DataTypes.CHAR(64), allowNull: false },
      userId: DataTypes.BIGINT.UNSIGNED,
      invitationId: DataTypes.BIGINT.UNSIGNED,
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
      usedAt: DataTypes.DATE(3),
      createdAt: DataTypes.DATE(3),
    },
    { tableName: 'one_time_tokens', updatedAt: false },
  );
