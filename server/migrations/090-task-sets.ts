import { DataTypes } from 'sequelize';
import { id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = ({ context }) =>
  context.createTable('task_sets', {
    id,
    firm_id: reference('firms'),
    study_id: reference('studies', { allowNull: true }),
    scenario_id: reference('scenarios', { allowNull: true }),
    run_id: reference('runs', { allowNull: true }),
    kind: { type: DataTypes.STRING(16), allowNull: false },
    name: { type: DataTypes.STRING(160), allowNull: false },
    state: { type: DataTypes.STRING(16), allowNull: false },
    settings: { type: DataTypes.TEXT('long'), allowNull: false },
    input: { type: DataTypes.BLOB('long'), allowNull: false },
    case_hash: DataTypes.STRING(80),
    solver_version: { type: DataTypes.STRING(20), allowNull: false },
    failure: DataTypes.TEXT,
    requested_by: reference('users'),
    requested_at: { type: DataTypes.DATE(3), allowNull: false },
    started_at: DataTypes.DATE(3),
    finished_at: DataTypes.DATE(3),
    served_at: DataTypes.DATE(3),
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('task_sets');
