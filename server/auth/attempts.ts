import { createHash } from 'node:crypto';
import { Op } from 'sequelize';
import type { Platform } from '../platform';
import { tooMany } from '../errors';

/** Attempts at one account that cost nothing but themselves. */
export const FREE_ATTEMPTS = 5;
const FIRST_WAIT_SECONDS = 30;
const LONGEST_WAIT_SECONDS = 15 * 60;
/** After this long without an attempt the count begins anew. */
const FORGET_SECONDS = 24 * 3600;

/** How long the next attempt must wait after `count` that failed: nothing, then doubling up to a quarter of an hour. */
export const waitAfter = (count: number): number =>
  count < FREE_ATTEMPTS
    ? 0
    : Math.min(FIRST_WAIT_SECONDS * 2 ** (count - FREE_ATTEMPTS), LONGEST_WAIT_SECONDS);

/**
 * Counts attempts by the address typed, in the database, so that many servers and restarts count together. An address
 * without an account is counted alike. An attempt counts as failed before it is tried: many at once find no gap.
 */
export function buildAttempts({ models, sequelize, now }: Platform) {
  const { SignInAttempt } = models;
  const keyOf = (email: string) => createHash('sha256').update(email).digest('hex');

  /** Throws `tooMany` while the account must wait. */
  async function begin(email: string): Promise<void> {
    const emailHash = keyOf(email);
    const at = now();
    // Outside of the transaction: the shared lock of an insert that finds its row there would meet others' in a deadlock.
    await SignInAttempt.bulkCreate([{ emailHash, count: 0, lastAt: at }], {
      ignoreDuplicates: true,
    });
    const wait = await sequelize.transaction(async (transaction) => {
      const kept = await SignInAttempt.findByPk(emailHash, {
        lock: transaction.LOCK.UPDATE,
        transaction,
        rejectOnEmpty: true,
      });
      const left = (kept.blockedUntil?.getTime() ?? 0) - at.getTime();
      if (left > 0) return Math.ceil(left / 1000);
      const fresh = at.getTime() - kept.lastAt.getTime() > FORGET_SECONDS * 1000;
      const count = (fresh ? 0 : kept.count) + 1;
      const blockedUntil = new Date(at.getTime() + waitAfter(count) * 1000);
      await kept.update({ count, lastAt: at, blockedUntil }, { transaction });
      return 0;
    });
    if (wait > 0) throw tooMany(wait);
  }

  /** The attempt succeeded, or the account has a new password. */
  const forget = (email: string) => SignInAttempt.destroy({ where: { emailHash: keyOf(email) } });

  const sweep = () =>
    SignInAttempt.destroy({
      where: { lastAt: { [Op.lt]: new Date(now().getTime() - FORGET_SECONDS * 1000) } },
    });

  return { begin, forget, sweep };
}

export type Attempts = ReturnType<typeof buildAttempts>;
