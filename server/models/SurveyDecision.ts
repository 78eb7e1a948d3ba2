import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { SurveyDecision } from '../../shared/surveys/types';
import type { UserModel } from './User';

/** What an engineer said of a revision. Only ever added to; the newest of a revision holds. */
export interface SurveyDecisionModel extends Model<
  InferAttributes<SurveyDecisionModel>,
  InferCreationAttributes<SurveyDecisionModel>
> {
  id: CreationOptional<number>;
  surveyRevisionId: number;
  decision: SurveyDecision['decision'];
  remarks: string;
  decidedBy: number;
  decidedAt: Date;
  decider?: NonAttribute<UserModel>;
}

export const defineSurveyDecision = (sequelize: Sequelize) =>
  sequelize.define<SurveyDecisionModel>(
    'SurveyDecision',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      surveyRevisionId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      decision: { type: DataTypes.STRING(16), allowNull: false },
      remarks: { type: DataTypes.TEXT, allowNull: false },
      decidedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      decidedAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { tableName: 'survey_decisions', timestamps: false },
  );
