import { DataTypes, type ModelAttributeColumnOptions, type QueryInterface } from 'sequelize';

/** One step of the schema. DDL commits by itself in MariaDB: one step a file, re-runnable, reversible. */
export type Step = (params: { context: QueryInterface }) => Promise<unknown>;

export const id: ModelAttributeColumnOptions = {
  type: DataTypes.BIGINT.UNSIGNED,
  primaryKey: true,
  autoIncrement: true,
};

/** A foreign key; what is referred to cannot vanish unless `onDelete` says so. */
export const reference = (
  table: string,
  { allowNull = false, onDelete = 'RESTRICT' } = {},
): ModelAttributeColumnOptions => ({
  type: DataTypes.BIGINT.UNSIGNED,
  allowNull,
  references: { model: table, key: 'id' },
  onDelete,
});

export const timestamps: Record<string, ModelAttributeColumnOptions> = {
  created_at: { type: DataTypes.DATE(3), allowNull: false },
  updated_at: { type: DataTypes.DATE(3), allowNull: false },
};

/** An index `table_field_field`; made once however often it is run. */
export const addIndex = (context: QueryInterface, table: string, fields: string[]) =>
  context.sequelize.query(
    `CREATE INDEX IF NOT EXISTS ${table}_${fields.join('_')} ON ${table} (${fields.join(', ')})`,
  );
