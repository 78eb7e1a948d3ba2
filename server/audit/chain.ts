import { createHash } from 'node:crypto';

/** What stands before the first row. */
export const FIRST_HASH = '0'.repeat(64);

/** Everything that a row says, as it is kept. */
export interface ChainedRow {
  at: Date;
  firmId: number | null;
  actorId: number | null;
  actor: string | null;
  fromAddress: string | null;
  action: string;
  words: string;
  recordKind: string | null;
  recordId: number | null;
  outcome: string;
}

/** SHA-256, hex, over the hash of the row before and the row's own values in this order, as JSON. */
export function chainHash(before: string, row: ChainedRow): string {
  const values = [
    before,
    row.at.toISOString(),
    row.firmId,
    row.actorId,
    row.actor,
    row.fromAddress,
    row.action,
    row.words,
    row.recordKind,
    row.recordId,
    row.outcome,
  ];
  return createHash('sha256').update(JSON.stringify(values)).digest('hex');
}
