import { Op, QueryTypes, type Sequelize } from 'sequelize';
import type { Models } from '../models';
import { chainHash, FIRST_HASH } from './chain';

export type ChainReport =
  | { holds: true; rows: number }
  /** The first row that does not follow from the one before; null: the end is not where it was written. */
  | { holds: false; rows: number; brokenAt: number | null };

const PORTION = 1000;

/** Goes through the whole trail from its first row and computes every hash anew. */
export async function verifyChain(
  sequelize: Sequelize,
  { AuditRow }: Models,
): Promise<ChainReport> {
  let [hash, last, rows] = [FIRST_HASH, 0, 0];
  // The end is read first: rows that are added meanwhile come after it.
  const [head] = await sequelize.query<{ hash: string }>(
    'SELECT hash FROM audit_head WHERE id = 1',
    { type: QueryTypes.SELECT },
  );
  let endSeen = head?.hash === FIRST_HASH;
  for (;;) {
    const portion = await AuditRow.findAll({
      where: { id: { [Op.gt]: last } },
      order: [['id', 'ASC']],
      limit: PORTION,
    });
    for (const row of portion) {
      hash = chainHash(hash, row);
      if (hash !== row.hash) return { holds: false, rows, brokenAt: row.id };
      endSeen ||= hash === head?.hash;
      rows += 1;
      last = row.id;
    }
    if (portion.length < PORTION) break;
  }
  return endSeen ? { holds: true, rows } : { holds: false, rows, brokenAt: null };
}
