import { DataTypes } from 'sequelize';
import { addIndex, id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = async ({ context }) => {
  await context.createTable('invitations', {
    id,
    firm_id: reference('firms'),
    email: { type: DataTypes.STRING(254), allowNull: false },
    roles: { type: DataTypes.TEXT('long'), allowNull: false },
    // Studies come later in the schema; they are never deleted.
    study_id: DataTypes.BIGINT.UNSIGNED,
    invited_by_id: reference('users'),
    expires_at: { type: DataTypes.DATE(3), allowNull: false },
    accepted_at: DataTypes.DATE(3),
    withdrawn_at: DataTypes.DATE(3),
    ...timestamps,
  });
  await addIndex(context, 'invitations', ['email']);
};

export const down: Step = ({ context }) => context.dropTable('invitations');
