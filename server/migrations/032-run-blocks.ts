import { DataTypes } from 'sequelize';
import { reference, type Step } from '../database/columns';

/** No id of their own: a block is found by run, kind and part, and lies beside its neighbours on disk. */
export const up: Step = ({ context }) =>
  context.createTable('run_blocks', {
    run_id: { ...reference('runs', { onDelete: 'CASCADE' }), primaryKey: true },
    kind: { type: DataTypes.STRING(16), primaryKey: true },
    part: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
    bytes: { type: DataTypes.BLOB('long'), allowNull: false },
  });

export const down: Step = ({ context }) => context.dropTable('run_blocks');
