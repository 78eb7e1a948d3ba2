import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { SurveyRevisionModel } from './SurveyRevision';
import type { UserModel } from './User';

/** The geometry that is routed: an accepted survey with the modeller's bank marks and roughness, or a working copy of one. */
export interface ReachModel extends Model<
  InferAttributes<ReachModel>,
  InferCreationAttributes<ReachModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  surveyRevisionId: number;
  /** The reach that this working geometry was copied from; null for the one made with its survey revision. */
  copiedFrom: CreationOptional<number | null>;
  name: string;
  /** `Section[]` as gzipped JSON. Large; left out of the default scope. */
  sections: Buffer;
  sectionCount: number;
  /** m. */
  firstChainage: number;
  lastChainage: number;
  /** Grows with each change. */
  version: CreationOptional<number>;
  updatedBy: number;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
  survey?: NonAttribute<SurveyRevisionModel>;
  updater?: NonAttribute<UserModel>;
}

export const defineReach = (sequelize: Sequelize) =>
  sequelize.define<ReachModel>(
    'Reach',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      surveyRevisionId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      copiedFrom: { type: DataTypes.BIGINT.UNSIGNED, allowNull: true, defaultValue: null },
      name: { type: DataTypes.STRING(120), allowNull: false },
      sections: { type: DataTypes.BLOB('long'), allowNull: false },
      sectionCount: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      firstChainage: { type: DataTypes.DOUBLE, allowNull: false },
      lastChainage: { type: DataTypes.DOUBLE, allowNull: false },
      version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 1 },
      updatedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    {
      tableName: 'reaches',
      defaultScope: { attributes: { exclude: ['sections'] } },
      scopes: { withSections: {} },
    },
  );
