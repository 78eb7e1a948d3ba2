import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';

/** What a gauge recorded of a flood. */
export interface GaugeModel extends Model<
  InferAttributes<GaugeModel>,
  InferCreationAttributes<GaugeModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  name: string;
  /** m. */
  chainage: number;
  flood: string;
  /** Clock time of t = 0. */
  startsAt: Date | null;
  /** Told from the record, kept for lists; m and m³/s. */
  stageCount: number;
  flowCount: number;
  peakStage: number | null;
  peakFlow: number | null;
  /** Stage and flow against time, gzip of JSON. Large; left out of the default scope. */
  record: Buffer;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

export const defineGauge = (sequelize: Sequelize) =>
  sequelize.define<GaugeModel>(
    'Gauge',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      name: { type: DataTypes.STRING(120), allowNull: false },
      chainage: { type: DataTypes.DOUBLE, allowNull: false },
      flood: { type: DataTypes.STRING(120), allowNull: false },
      startsAt: DataTypes.DATE(3),
      stageCount: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      flowCount: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      peakStage: DataTypes.DOUBLE,
      peakFlow: DataTypes.DOUBLE,
      record: { type: DataTypes.BLOB('long'), allowNull: false },
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    {
      tableName: 'gauges',
      defaultScope: { attributes: { exclude: ['record'] } },
      scopes: { withRecord: {} },
    },
  );
