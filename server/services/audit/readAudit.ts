import { Op, type WhereOptions } from 'sequelize';
import type { AuditQuery } from '../../../shared/audit/schemas';
import type { AuditRowModel } from '../../models/AuditRow';
import type { Platform } from '../../platform';
import { csvField } from '../../results/exports/csvField';

const PAGE = 100;
/** Rows that the CSV reads at once. */
const PORTION = 1000;

const HEADINGS = ['id', 'at', 'actor', 'from', 'action', 'words', 'record', 'outcome', 'hash'];

/** What administrators read of their own firm's trail, newest first. */
export function buildReadAudit({ models }: Platform) {
  const where = (firmId: number, { action, actor, before }: AuditQuery): WhereOptions => ({
    firmId,
    ...(before !== undefined && { id: { [Op.lt]: before } }),
    ...(actor && { actor: { [Op.like]: `%${escaped(actor)}%` } }),
    ...(action && { action: { [Op.like]: `${escaped(action)}%` } }),
  });
  const read = (firmId: number, query: AuditQuery, limit: number): Promise<AuditRowModel[]> =>
    models.AuditRow.findAll({ where: where(firmId, query), order: [['id', 'DESC']], limit });

  async function page(firmId: number, query: AuditQuery) {
    const rows = await read(firmId, query, PAGE + 1);
    const shown = rows.slice(0, PAGE);
    return { rows: shown, next: rows.length > PAGE ? shown[PAGE - 1].id : null };
  }

  /** Pieces of text, read as they are taken. */
  async function* csv(firmId: number, query: AuditQuery): AsyncGenerator<string> {
    yield `${HEADINGS.join(',')}\r\n`;
    let before = query.before;
    for (;;) {
      const rows = await read(firmId, { ...query, before }, PORTION);
      yield rows.map(line).join('');
      if (rows.length < PORTION) return;
      before = rows[rows.length - 1].id;
    }
  }

  return { page, csv };
}

const line = (row: AuditRowModel): string => {
  const record = row.recordKind === null ? '' : `${row.recordKind} ${row.recordId}`;
  const { action, actor, at, fromAddress, hash, id, outcome, words } = row;
  const values = [id, at.toISOString(), actor, fromAddress, action, words, record, outcome, hash];
  return `${values.map((value) => csvField(String(value ?? ''))).join(',')}\r\n`;
};

/** Signs that mean something to LIKE. */
const escaped = (text: string): string => text.replaceAll(/[\\%_]/g, '\\$&');
