import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { TaskSetKind, TaskState } from '../../shared/tasks/types';
import { jsonColumn } from '../database/jsonColumn';
import type { RunModel } from './Run';
import type { StudyModel } from './Study';
import type { UserModel } from './User';
import { failureColumns, type FailureFields } from './failure';

/** Work beside the runs: many computations that belong together, and what was asked of them. */
export interface TaskSetModel extends Model<
  InferAttributes<TaskSetModel>,
  InferCreationAttributes<TaskSetModel>
> {
  id: CreationOptional<number>;
  firmId: number;
  /** Verification belongs to no study. */
  studyId: number | null;
  scenarioId: number | null;
  /** The run whose frozen case it varies. */
  runId: number | null;
  kind: TaskSetKind;
  name: string;
  state: TaskState;
  /** What was chosen, small enough to show. */
  settings: unknown;
  /** What all its tasks need: gzip of JSON. Large; left out of the default scope. */
  input: Buffer;
  caseHash: string | null;
  solverVersion: string;
  failure: FailureFields['failure'];
  failureParts: FailureFields['failureParts'];
  requestedBy: number;
  requestedAt: Date;
  startedAt: CreationOptional<Date | null>;
  finishedAt: CreationOptional<Date | null>;
  /** When a task of it was last begun: sets take turns. */
  servedAt: CreationOptional<Date | null>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
  requester?: NonAttribute<UserModel>;
  run?: NonAttribute<RunModel | null>;
  /** Verification belongs to none. */
  study?: NonAttribute<StudyModel | null>;
}

export const defineTaskSet = (sequelize: Sequelize) =>
  sequelize.define<TaskSetModel>(
    'TaskSet',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      firmId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      studyId: DataTypes.BIGINT.UNSIGNED,
      scenarioId: DataTypes.BIGINT.UNSIGNED,
      runId: DataTypes.BIGINT.UNSIGNED,
      kind: { type: DataTypes.STRING(16), allowNull: false },
      name: { type: DataTypes.STRING(160), allowNull: false },
      state: { type: DataTypes.STRING(16), allowNull: false },
      settings: jsonColumn<unknown>('settings'),
      input: { type: DataTypes.BLOB('long'), allowNull: false },
      caseHash: DataTypes.STRING(80),
      solverVersion: { type: DataTypes.STRING(20), allowNull: false },
      ...failureColumns(),
      requestedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      requestedAt: { type: DataTypes.DATE(3), allowNull: false },
      startedAt: DataTypes.DATE(3),
      finishedAt: DataTypes.DATE(3),
      servedAt: DataTypes.DATE(3),
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'task_sets', defaultScope: { attributes: { exclude: ['input'] } } },
  );
