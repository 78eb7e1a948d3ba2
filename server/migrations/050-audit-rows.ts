import { DataTypes } from 'sequelize';
import { addIndex, id, type Step } from '../database/columns';

/** Refers to nothing by foreign key: what a row tells stays, whatever becomes of the record. */
export const up: Step = async ({ context }) => {
  await context.createTable('audit_rows', {
    id,
    at: { type: DataTypes.DATE(3), allowNull: false },
    firm_id: DataTypes.BIGINT.UNSIGNED,
    actor_id: DataTypes.BIGINT.UNSIGNED,
    actor: DataTypes.STRING(254),
    from_address: DataTypes.STRING(64),
    action: { type: DataTypes.STRING(60), allowNull: false },
    words: { type: DataTypes.STRING(500), allowNull: false },
    record_kind: DataTypes.STRING(40),
    record_id: DataTypes.BIGINT.UNSIGNED,
    outcome: { type: DataTypes.STRING(10), allowNull: false },
    hash: { type: DataTypes.CHAR(64), allowNull: false },
  });
  await addIndex(context, 'audit_rows', ['firm_id', 'id']);
};

export const down: Step = ({ context }) => context.dropTable('audit_rows');
