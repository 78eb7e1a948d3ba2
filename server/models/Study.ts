import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import { UNIT_SYSTEMS, type UnitSystem } from '../../shared/units/units';
import type { UserModel } from './User';

/** One question of one client about one reach. */
export interface StudyModel extends Model<
  InferAttributes<StudyModel>,
  InferCreationAttributes<StudyModel>
> {
  id: CreationOptional<number>;
  firmId: number;
  title: string;
  clientName: string;
  place: string;
  verticalDatum: string;
  coordinateSystem: CreationOptional<string>;
  unitSystem: UnitSystem;
  purpose: string;
  createdBy: number;
  createdAt: CreationOptional<Date>;
  /** Moves with every piece of work in the study, so that the newest work comes first. */
  updatedAt: CreationOptional<Date>;
  creator?: NonAttribute<UserModel>;
}

export const defineStudy = (sequelize: Sequelize) =>
  sequelize.define<StudyModel>(
    'Study',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      firmId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      title: { type: DataTypes.STRING(120), allowNull: false },
      clientName: { type: DataTypes.STRING(120), allowNull: false },
      place: { type: DataTypes.STRING(120), allowNull: false },
      verticalDatum: { type: DataTypes.STRING(120), allowNull: false },
      coordinateSystem: { type: DataTypes.STRING(120), allowNull: false, defaultValue: '' },
      unitSystem: {
        type: DataTypes.STRING(16),
        allowNull: false,
        validate: { isIn: [[...UNIT_SYSTEMS]] },
      },
      purpose: { type: DataTypes.TEXT, allowNull: false },
      createdBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'studies' },
  );
