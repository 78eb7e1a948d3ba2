import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { ScenarioBody } from '../../shared/scenarios/schemas';
import { jsonColumn } from '../database/jsonColumn';
import type { UserModel } from './User';

/** One flood on one reach, as it was typed; it may be incomplete. */
export interface ScenarioModel extends Model<
  InferAttributes<ScenarioModel>,
  InferCreationAttributes<ScenarioModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  reachId: number;
  name: string;
  body: ScenarioBody;
  /** m³/s; null while there is no inflow. Told from body, kept for lists. */
  peakInflow: number | null;
  /** Told from body and reach, kept for lists. */
  faultCount: number;
  /** Grows with each change. */
  version: CreationOptional<number>;
  updatedBy: number;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
  updater?: NonAttribute<UserModel>;
}

export const defineScenario = (sequelize: Sequelize) =>
  sequelize.define<ScenarioModel>(
    'Scenario',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      reachId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      name: { type: DataTypes.STRING(120), allowNull: false },
      body: jsonColumn<ScenarioBody>('body'),
      peakInflow: DataTypes.DOUBLE,
      faultCount: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 1 },
      updatedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'scenarios' },
  );
