import { DataTypes } from 'sequelize';
import { id, reference, type Step } from '../database/columns';

/** One of each paper and standing: whoever asks again gets the same bytes. */
export const up: Step = ({ context }) =>
  context.createTable(
    'reports',
    {
      id,
      run_id: reference('runs'),
      standing: { type: DataTypes.STRING(16), allowNull: false },
      paper: { type: DataTypes.STRING(8), allowNull: false },
      hash: { type: DataTypes.CHAR(64), allowNull: false },
      bytes: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      pages: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      pdf: { type: DataTypes.BLOB('long'), allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { uniqueKeys: { reports_once: { fields: ['run_id', 'standing', 'paper'] } } },
  );

export const down: Step = ({ context }) => context.dropTable('reports');
