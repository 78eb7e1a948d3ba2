import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { StudyMember } from '../../shared/studies/types';
import type { UserModel } from './User';

/** A surveyor or client with whom a study is shared. */
export interface StudyMemberModel extends Model<
  InferAttributes<StudyMemberModel>,
  InferCreationAttributes<StudyMemberModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  userId: number;
  as: StudyMember['as'];
  createdAt: CreationOptional<Date>;
  user?: NonAttribute<UserModel>;
}

export const defineStudyMember = (sequelize: Sequelize) =>
  sequelize.define<StudyMemberModel>(
    'StudyMember',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      userId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      as: { type: DataTypes.STRING(16), allowNull: false },
      createdAt: DataTypes.DATE(3),
    },
    { tableName: 'study_members', updatedAt: false },
  );
