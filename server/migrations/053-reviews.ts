import { DataTypes } from 'sequelize';
import { addIndex, id, reference, timestamps, type Step } from '../database/columns';

export const up: Step = async ({ context }) => {
  await context.createTable('reviews', {
    id,
    run_id: { ...reference('runs'), unique: true },
    state: { type: DataTypes.STRING(16), allowNull: false },
    sent_by: reference('users', { allowNull: true }),
    sent_to: reference('users', { allowNull: true }),
    sent_at: DataTypes.DATE(3),
    method: { type: DataTypes.TEXT, allowNull: false },
    assumptions: { type: DataTypes.TEXT, allowNull: false },
    limits: { type: DataTypes.TEXT, allowNull: false },
    answers: { type: DataTypes.TEXT('long'), allowNull: false },
    return_reason: DataTypes.TEXT,
    outlet_probe_run_id: reference('runs', { allowNull: true }),
    ...timestamps,
  });
  await addIndex(context, 'reviews', ['state', 'sent_at']);
};

export const down: Step = ({ context }) => context.dropTable('reviews');
