import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
  type Sequelize,
} from 'sequelize';
import type { BlockKind } from '../results/blocks/blockTypes';

/** A piece of the results of a routed run: gzip; see `results/blocks/blockTypes.ts`. */
export interface RunBlockModel extends Model<
  InferAttributes<RunBlockModel>,
  InferCreationAttributes<RunBlockModel>
> {
  runId: number;
  kind: BlockKind;
  part: number;
  bytes: Buffer;
}

export const defineRunBlock = (sequelize: Sequelize) =>
  sequelize.define<RunBlockModel>(
    'RunBlock',
    {
      runId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true },
      kind: { type: DataTypes.STRING(16), primaryKey: true },
      part: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      bytes: { type: DataTypes.BLOB('long'), allowNull: false },
    },
    { tableName: 'run_blocks', timestamps: false },
  );
