import { DataTypes } from 'sequelize';
import { reference, timestamps, type Step } from '../database/columns';

/** Of each run at most one observed flood is printed in its report. */
export const up: Step = ({ context }) =>
  context.createTable('reported_floods', {
    run_id: { ...reference('runs', { onDelete: 'CASCADE' }), primaryKey: true },
    flood: { type: DataTypes.STRING(120), allowNull: false },
    ...timestamps,
  });

export const down: Step = ({ context }) => context.dropTable('reported_floods');
