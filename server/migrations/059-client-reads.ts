import { DataTypes } from 'sequelize';
import { reference, type Step } from '../database/columns';

/** No id of its own: a client confirms a run once. */
export const up: Step = ({ context }) =>
  context.createTable('client_reads', {
    run_id: { ...reference('runs'), primaryKey: true },
    user_id: { ...reference('users'), primaryKey: true },
    at: { type: DataTypes.DATE(3), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('client_reads');
