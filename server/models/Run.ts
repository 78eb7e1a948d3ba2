import {
  DataTypes,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type NonAttribute,
  type Sequelize,
} from 'sequelize';
import type { Run, RunState } from '../../shared/runs/types';
import { jsonColumn } from '../database/jsonColumn';
import { failureColumns, type FailureFields } from './failure';
import type { IssueModel } from './Issue';
import type { ReviewModel } from './Review';
import type { SignOffModel } from './SignOff';
import type { StudyModel } from './Study';
import type { UserModel } from './User';
import type { WithdrawalModel } from './Withdrawal';

/** One computation of a scenario with its inputs as they were when it was asked for. */
export interface RunModel extends Model<
  InferAttributes<RunModel>,
  InferCreationAttributes<RunModel>
> {
  id: CreationOptional<number>;
  studyId: number;
  scenarioId: number;
  reachId: number;
  /** Counted within the study. */
  number: number;
  scenarioName: string;
  state: RunState;
  /** The frozen case: gzip of canonical JSON. Large; left out of the default scope. */
  caseBytes: Buffer;
  caseHash: string;
  solverVersion: string;
  /** s */
  duration: number;
  startsAt: Date | null;
  inflow: Run['inflow'];
  progress: CreationOptional<number>;
  secondsLeft: CreationOptional<number | null>;
  /** How often a worker has begun it. */
  attempts: CreationOptional<number>;
  /** A fresh one each time it is claimed; whoever does not hold it may not write. */
  leaseOwner: CreationOptional<string | null>;
  leaseUntil: CreationOptional<Date | null>;
  cancelRequested: CreationOptional<boolean>;
  /** Why the last attempt was broken off. */
  interruption: CreationOptional<string | null>;
  failure: FailureFields['failure'];
  failureParts: FailureFields['failureParts'];
  requestedBy: number;
  requestedAt: Date;
  startedAt: CreationOptional<Date | null>;
  finishedAt: CreationOptional<Date | null>;
  /** At the outlet: m and m³/s. */
  peakStage: CreationOptional<number | null>;
  peakFlow: CreationOptional<number | null>;
  createdAt: CreationOptional<Date>;
  updatedAt: CreationOptional<Date>;
  study?: NonAttribute<StudyModel>;
  requester?: NonAttribute<UserModel>;
  review?: NonAttribute<ReviewModel | null>;
  /** The check whose outlet this run tries. */
  triedFor?: NonAttribute<ReviewModel | null>;
  signOff?: NonAttribute<SignOffModel | null>;
  issue?: NonAttribute<IssueModel | null>;
  withdrawal?: NonAttribute<WithdrawalModel | null>;
}

export const defineRun = (sequelize: Sequelize) =>
  sequelize.define<RunModel>(
    'Run',
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      studyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      scenarioId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      reachId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      number: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      scenarioName: { type: DataTypes.STRING(120), allowNull: false },
      state: { type: DataTypes.STRING(16), allowNull: false },
      caseBytes: { type: DataTypes.BLOB('long'), allowNull: false },
      caseHash: { type: DataTypes.STRING(80), allowNull: false },
      solverVersion: { type: DataTypes.STRING(20), allowNull: false },
      duration: { type: DataTypes.DOUBLE, allowNull: false },
      startsAt: DataTypes.DATE(3),
      inflow: jsonColumn<Run['inflow']>('inflow'),
      progress: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 0 },
      secondsLeft: DataTypes.DOUBLE,
      attempts: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
      leaseOwner: DataTypes.STRING(36),
      leaseUntil: DataTypes.DATE(3),
      cancelRequested: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      interruption: DataTypes.STRING(500),
      ...failureColumns(),
      requestedBy: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
      requestedAt: { type: DataTypes.DATE(3), allowNull: false },
      startedAt: DataTypes.DATE(3),
      finishedAt: DataTypes.DATE(3),
      peakStage: DataTypes.DOUBLE,
      peakFlow: DataTypes.DOUBLE,
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    { tableName: 'runs', defaultScope: { attributes: { exclude: ['caseBytes'] } } },
  );
