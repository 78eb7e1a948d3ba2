import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { SurveyDecisionModel } from './SurveyDecision';
import type { UserModel } from './User';

/** A survey as it was accepted. Rows are written once and never changed. */
export interface SurveyRevisionModel extends Model<
  InferAttributes<SurveyRevisionModel>,
  InferCreationAttributes<SurveyRevisionModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  /** Counted within the study. */
  revision: number;
  fileName: string;
  /** SHA-256 of the file, hex. */
  fileHash: string;
  /** The file as it was sent. Large; left out of the default scope. */
  file: Buffer;
  /** `Section[]` as gzipped JSON. Large; left out of the default scope. */
  sections: Buffer;
  note: string;
  sectionCount: number;
  pointCount: number;
  /** m. */
  firstChainage: number;
  lastChainage: number;
  sentBy: number;
  sentAt: Date;
  sender?: NonAttribute<UserModel>;
  decisions?: NonAttribute<SurveyDecisionModel[]>;
}

export const defineSurveyRevision = (sequelize: Sequelize) =>
  sequelize.define<SurveyRevisionModel>(
    'SurveyRevision',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      revision: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      fileName: { type: DataTypes.STRING(255), allowNull: false },
      fileHash: { type: DataTypes.CHAR(64), allowNull: false },
      file: { type: DataTypes.BLOB('long'), allowNull: false },
      sections: { type: DataTypes.BLOB('long'), allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      sectionCount: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      pointCount: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      firstChainage: { type: DataTypes.DOUBLE, allowNull: false },
      lastChainage: { type: DataTypes.DOUBLE, allowNull: false },
      sentBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      sentAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    {
      tableName: 'survey_revisions',
      timestamps: false,
      defaultScope: { attributes: { exclude: ['file', 'sections'] } },
      scopes: { withSections: { attributes: { exclude: ['file'] } } },
    },
  );
