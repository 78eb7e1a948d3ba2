import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { SurveyFault } from '../../shared/surveys/types';
import { jsonColumn } from '../database/jsonColumn';
import type { UserModel } from './User';

/** What is kept of a refused survey: its name and its faults. */
export interface SurveyRefusalModel extends Model<
  InferAttributes<SurveyRefusalModel>,
  InferCreationAttributes<SurveyRefusalModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  fileName: string;
  faultCount: number;
  faults: SurveyFault[];
  sentBy: number;
  sentAt: Date;
  sender?: NonAttribute<UserModel>;
}

export const defineSurveyRefusal = (sequelize: Sequelize) =>
  sequelize.define<SurveyRefusalModel>(
    'SurveyRefusal',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      fileName: { type: DataTypes.STRING(255), allowNull: false },
      faultCount: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      faults: jsonColumn<SurveyFault[]>('faults'),
      sentBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      sentAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'survey_refusals', timestamps: false },
  );
