import type { AuditRow } from '../../shared/audit/types';
import type { AuditRowModel } from '../models/AuditRow';

export const presentAuditRow = (row: AuditRowModel): AuditRow => ({
  id: row.id,
  at: row.at.toISOString(),
  actor: row.actor,
  from: row.fromAddress,
  action: row.action,
  words: row.words,
  record:
    row.recordKind === null || row.recordId === null
      ? null
      : { kind: row.recordKind, id: row.recordId },
  outcome: row.outcome,
  hash: row.hash,
});
