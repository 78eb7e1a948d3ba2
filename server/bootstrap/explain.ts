import { MigrationError } from 'umzug';
import { NewerSchemaError } from '../database/migrate';
import { SettingsError } from '../env';
import { AppError } from '../errors';
import { BootstrapError } from './BootstrapError';

/** Numbers of MariaDB for a disk or a table that is full. */
const FULL = new Set([1021, 1041, 1114]);

interface Said {
  code?: string;
  errno?: number;
  path?: string;
  message?: string;
  parent?: Said;
  cause?: Said;
}

/** What a person is told of why the product does not start; null for what is a fault of ours. */
export function explain(error: unknown): string | null {
  if (
    error instanceof BootstrapError ||
    error instanceof AppError ||
    error instanceof NewerSchemaError ||
    error instanceof SettingsError
  )
    return error.message;
  const said = error as Said;
  if (error instanceof MigrationError && said.cause) return explain(said.cause);
  const { code, errno } = said.parent ?? said;
  const where = said.path ? ` (${said.path})` : '';
  if (code === 'ENOSPC' || code === 'EDQUOT' || FULL.has(errno ?? 0))
    return `The disk is full${where}. Make room and start again; what was stored before is safe.`;
  if (code === 'EACCES' || code === 'EPERM' || code === 'EROFS' || code === 'ENOTDIR')
    return `Spate may not write there${where}. Give the files to the user who starts it, or name another data directory in DATA_DIR.`;
  if (code === 'ECONNREFUSED' || code === 'ENOTFOUND' || code === 'ETIMEDOUT')
    return 'The database does not answer. Check DATABASE_URL, and that its server runs.';
  if (code === 'ER_ACCESS_DENIED_ERROR' || code === 'ER_DBACCESS_DENIED_ERROR')
    return 'The database refuses the user of DATABASE_URL. Check name and password, and that the user may do everything in its database.';
  if (code === 'ER_BAD_DB_ERROR')
    return 'The database that DATABASE_URL names does not exist. Make it first (utf8mb4).';
  return null;
}
