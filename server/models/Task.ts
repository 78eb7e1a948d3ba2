import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';
import type { TaskState } from '../../shared/tasks/types';
import { failureColumns, type FailureFields } from './failure';

/** One computation of a set; `gather` is the last, which makes one result of those of all members. */
export interface TaskModel extends Model<
  InferAttributes<TaskModel>,
  InferCreationAttributes<TaskModel>
> {
  id: CreationOptional<number>;
  setId: number;
  /** Order within its set, from 0. */
  position: number;
  part: 'member' | 'gather';
  label: string;
  state: TaskState;
  /** gzip of JSON; large, like `result`: both are left out of the default scope. */
  payload: Buffer;
  result: CreationOptional<Buffer | null>;
  /** gzip of JSON: what an attempt had found before it broke off. Left out of the default scope. */
  notes: CreationOptional<Buffer | null>;
  progress: CreationOptional<number>;
  attempts: CreationOptional<number>;
  /** A fresh one each time it is claimed; whoever does not hold it may not write. */
  leaseOwner: CreationOptional<string | null>;
  leaseUntil: CreationOptional<Date | null>;
  /** Why the last attempt was broken off. */
  interruption: CreationOptional<string | null>;
  failure: FailureFields['failure'];
  failureParts: FailureFields['failureParts'];
  startedAt: CreationOptional<Date | null>;
  finishedAt: CreationOptional<Date | null>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
}

export const defineTask = (sequelize: Sequelize) =>
  sequelize.define<TaskModel>(
    'Task',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      setId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      position: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      part: { type: DataTypes.STRING(16), allowNull: false },
      label: { type: DataTypes.STRING(160), allowNull: false },
      state: { type: DataTypes.STRING(16), allowNull: false },
      payload: { type: DataTypes.BLOB('long'), allowNull: false },
      result: DataTypes.BLOB('long'),
      notes: DataTypes.BLOB('long'),
      progress: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 0 },
      attempts: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
      leaseOwner: DataTypes.STRING(36),
      leaseUntil: DataTypes.DATE(3),
      interruption: DataTypes.STRING(500),
      ...failureColumns(),
      startedAt: DataTypes.DATE(3),
      finishedAt: DataTypes.DATE(3),
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    {
      tableName: 'tasks',
      defaultScope: { attributes: { exclude: ['payload', 'result', 'notes'] } },
    },
  );
