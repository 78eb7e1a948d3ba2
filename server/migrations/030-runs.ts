import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('runs', {
    id,
    study_id: reference('studies'),
    scenario_id: reference('scenarios'),
    reach_id: reference('reaches'),
    number: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    scenario_name: { type: DataTypes.STRING(120), allowNull: false },
    state: { type: DataTypes.STRING(16), allowNull: false },
    case_bytes: { type: DataTypes.BLOB('long'), allowNull: false },
    case_hash: { type: DataTypes.STRING(80), allowNull: false },
    solver_version: { type: DataTypes.STRING(20), allowNull: false },
    duration: { type: DataTypes.DOUBLE, allowNull: false },
    starts_at: DataTypes.DATE(3),
    inflow: { type: DataTypes.TEXT('long'), allowNull: false },
    progress: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 0 },
    seconds_left: DataTypes.DOUBLE,
    attempts: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
    lease_owner: DataTypes.STRING(36),
    lease_until: DataTypes.DATE(3),
    cancel_requested: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    interruption: DataTypes.STRING(500),
    failure: DataTypes.TEXT,
    requested_by: reference('users'),
    requested_at: { type: DataTypes.DATE(3), allowNull: false },
    started_at: DataTypes.DATE(3),
    finished_at: DataTypes.DATE(3),
    peak_stage: DataTypes.DOUBLE,
    peak_flow: DataTypes.DOUBLE,
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('runs');
