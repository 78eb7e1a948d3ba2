import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('gauges', {
    id,
    study_id: reference('studies', { onDelete: 'CASCADE' }),
    name: { type: DataTypes.STRING(120), allowNull: false },
    chainage: { type: DataTypes.DOUBLE, allowNull: false },
    flood: { type: DataTypes.STRING(120), allowNull: false },
    starts_at: DataTypes.DATE(3),
    stage_count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    flow_count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    peak_stage: DataTypes.DOUBLE,
    peak_flow: DataTypes.DOUBLE,
    record: { type: DataTypes.BLOB('long'), allowNull: false },
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('gauges');
