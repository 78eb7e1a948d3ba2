import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** Attempts to sign in that were not followed by success, by address typed, whether it has an account or not. */
export interface SignInAttemptModel extends Model<
  InferAttributes<SignInAttemptModel>,
  InferCreationAttributes<SignInAttemptModel>
> {
  /** SHA-256 of the e-mail address, hex: addresses of strangers are nobody's to keep. */
  emailHash: string;
  count: number;
  lastAt: Date;
  blockedUntil: CreationOptional<Date | null>;
}

export const defineSignInAttempt = (sequelize: Sequelize) =>
  sequelize.define<SignInAttemptModel>(
    'SignInAttempt',
    {
      emailHash: { type: DataTypes.CHAR(64), primaryKey: true },
      count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      lastAt: { type: DataTypes.DATE(3), allowNull: false },
      blockedUntil: DataTypes.DATE(3),
    },
    { tableName: 'sign_in_attempts', timestamps: false },
  );
