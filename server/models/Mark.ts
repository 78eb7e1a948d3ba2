import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';
import type { MarkConfidence, MarkKind } from '../../shared/calibration/types';

/** How high the water stood somewhere at the height of an observed flood. */
export interface MarkModel extends Model<
  InferAttributes<MarkModel>,
  InferCreationAttributes<MarkModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  /** m. */
  chainage: number;
  /** m above the study's datum. */
  level: number;
  kind: MarkKind;
  confidence: MarkConfidence;
  flood: string;
  /** `2024-01-09`. */
  observedOn: string | null;
  note: string;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

export const defineMark = (sequelize: Sequelize) =>
  sequelize.define<MarkModel>(
    'Mark',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      chainage: { type: DataTypes.DOUBLE, allowNull: false },
      level: { type: DataTypes.DOUBLE, allowNull: false },
      kind: { type: DataTypes.STRING(20), allowNull: false },
      confidence: { type: DataTypes.STRING(10), allowNull: false },
      flood: { type: DataTypes.STRING(120), allowNull: false },
      observedOn: DataTypes.DATEONLY,
      note: { type: DataTypes.TEXT, allowNull: false },
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'marks' },
  );
