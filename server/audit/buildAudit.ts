import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { Models } from '../models';
import { chainHash } from './chain';
import { requestContext } from './requestContext';

export interface AuditEntry {
  /** e.g. `run.signed`. */
  action: string;
  /** In words, e.g. `Run 3 of Lower Veshall signed`. */
  words: string;
  record?: { kind: string; id: number } | null;
  /** Without it: who asks in the present request. */
  actor?: { id: number; firmId: number } | null;
  /** Firm whose administrators read it, where nobody is signed in. */
  firmId?: number | null;
  /** What stands for the name where nobody is signed in, e.g. the address typed. */
  actorName?: string | null;
  outcome?: 'done' | 'refused';
}

export type Audit = ReturnType<typeof buildAudit>;

/** The audit trail: append-only, each row with the hash of the one before, in one chain for the whole database. */
export function buildAudit(sequelize: Sequelize, models: Models, now: () => Date) {
  /**
   * Adds a row, in the transaction of the change that it tells of: both are kept, or neither. It must be the last thing
   * that the transaction does: the end of the chain is locked from here to its commit.
   */
  async function note(entry: AuditEntry, transaction?: Transaction): Promise<void> {
    if (!transaction) return sequelize.transaction((own) => note(entry, own));
    const context = requestContext.getStore();
    const asking = entry.actor ?? context?.actor() ?? null;
    const person = asking && (await models.User.findByPk(asking.id, { transaction }));
    const [head] = await sequelize.query<{ hash: string }>(
      'SELECT hash FROM audit_head WHERE id = 1 FOR UPDATE',
      { type: QueryTypes.SELECT, transaction },
    );
    const row = {
      at: now(),
      firmId: asking?.firmId ?? entry.firmId ?? null,
      actorId: asking?.id ?? null,
      actor: (person?.name ?? entry.actorName ?? null)?.slice(0, 254) ?? null,
      fromAddress: context?.address?.slice(0, 64) ?? null,
      action: entry.action,
      words: entry.words.slice(0, 500),
      recordKind: entry.record?.kind ?? null,
      recordId: entry.record?.id ?? null,
      outcome: entry.outcome ?? ('done' as const),
    };
    const hash = chainHash(head.hash, row);
    await models.AuditRow.create({ ...row, hash }, { transaction });
    await sequelize.query('UPDATE audit_head SET hash = ? WHERE id = 1', {
      replacements: [hash],
      type: QueryTypes.UPDATE,
      transaction,
    });
    if (context) context.noted = true;
  }

  return { note };
}
