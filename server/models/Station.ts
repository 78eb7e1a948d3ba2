import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';
import type { StationLevel } from '../../shared/studies/stationLevels';
import { jsonColumn } from '../database/jsonColumn';

/** A named place on the reach of a study. */
export interface StationModel extends Model<
  InferAttributes<StationModel>,
  InferCreationAttributes<StationModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  name: string;
  /** m. */
  chainage: number;
  /** null: none. */
  levels: CreationOptional<StationLevel[] | null>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

export const defineStation = (sequelize: Sequelize) =>
  sequelize.define<StationModel>(
    'Station',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      name: { type: DataTypes.STRING(120), allowNull: false },
      chainage: { type: DataTypes.DOUBLE, allowNull: false },
      levels: jsonColumn<StationLevel[]>('levels', true),
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'stations' },
  );
