import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

/** Name and standing are kept as they were: people change theirs. */
export const up: Step = ({ context }) =>
  context.createTable('sign_offs', {
    id,
    run_id: { ...reference('runs'), unique: true },
    review_id: reference('reviews'),
    signed_by: reference('users'),
    signer_name: { type: DataTypes.STRING(120), allowNull: false },
    qualification: { type: DataTypes.STRING(120), allowNull: false },
    registration_number: { type: DataTypes.STRING(120), allowNull: false },
    statement: { type: DataTypes.TEXT, allowNull: false },
    at: { type: DataTypes.DATE(3), allowNull: false },
    case_hash: { type: DataTypes.STRING(80), allowNull: false },
    solver_version: { type: DataTypes.STRING(20), allowNull: false },
    verification_code: { type: DataTypes.CHAR(16), allowNull: false, unique: true },
    supersedes_run_id: reference('runs', { allowNull: true }),
    record: { type: DataTypes.BLOB('long'), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('sign_offs');
