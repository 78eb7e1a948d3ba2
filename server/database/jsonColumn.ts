import { DataTypes, type Model, type ModelAttributeColumnOptions } from 'sequelize';

/**
 * A JSON value kept as text. MariaDB's JSON type is text too, and its driver parses it or not by server version;
 * so it is read and written here, the same everywhere.
 */
export const jsonColumn = <T>(name: string, allowNull = false): ModelAttributeColumnOptions => ({
  type: DataTypes.TEXT('long'),
  allowNull,
  get(this: Model): T | null {
    const text = this.getDataValue(name) as unknown;
    return typeof text === 'string' ? (JSON.parse(text) as T) : ((text ?? null) as T | null);
  },
  set(this: Model, value: T | null) {
    this.setDataValue(name, value === null ? null : JSON.stringify(value));
  },
});
