import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** A consultancy. Everything that it owns is invisible to every other firm. */
export interface FirmModel extends Model<
  InferAttributes<FirmModel>,
  InferCreationAttributes<FirmModel>
> {
  id: CreationOptional<number>;
  name: string;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

export const defineFirm = (sequelize: Sequelize) =>
  sequelize.define<FirmModel>(
    'Firm',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      name: { type: DataTypes.STRING(120), allowNull: false },
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'firms' },
  );
