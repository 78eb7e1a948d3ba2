import { DataTypes } from 'sequelize';
import { FIRST_HASH } from '../audit/chain';
import type { Step } from '../database/columns';

/** One row: the end of the chain. Whoever holds its lock writes the next one, so that the chain never forks. */
export const up: Step = async ({ context }) => {
  await context.createTable('audit_head', {
    id: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
    hash: { type: DataTypes.CHAR(64), allowNull: false },
  });
  await context.sequelize.query(
    `INSERT IGNORE INTO audit_head (id, hash) VALUES (1, '${FIRST_HASH}')`,
  );
};

export const down: Step = ({ context }) => context.dropTable('audit_head');
