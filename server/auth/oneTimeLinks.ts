import { Op, type Transaction } from 'sequelize';
import { gone } from '../errors';
import type { OneTimeTokenKind, OneTimeTokenModel } from '../models/OneTimeToken';
import type { Platform } from '../platform';
import { hashToken, makeToken } from './oneWayToken';

/** Whom a link is for. */
export type LinkTarget = { userId: number } | { invitationId: number };

/** Path in the client and life of each kind of link. */
const KINDS: Record<OneTimeTokenKind, { path: string; seconds: number }> = {
  reset: { path: '/reset', seconds: 3600 },
  invitation: { path: '/invitation', seconds: 7 * 86_400 },
};

export const linkSeconds = (kind: OneTimeTokenKind): number => KINDS[kind].seconds;

/** Links in mail that work once; only their hash is kept. */
export function buildOneTimeLinks({ env, models, now }: Platform) {
  const { OneTimeToken } = models;

  /** Makes a link and ends earlier ones of the same kind for the same target. */
  async function issue(
    kind: OneTimeTokenKind,
    target: LinkTarget,
    transaction?: Transaction,
  ): Promise<string> {
    await end(kind, target, transaction);
    const token = makeToken();
    const expiresAt = new Date(now().getTime() + KINDS[kind].seconds * 1000);
    await OneTimeToken.create(
      { kind, tokenHash: hashToken(token), expiresAt, ...target },
      { transaction },
    );
    return `${env.publicUrl}${KINDS[kind].path}?token=${token}`;
  }

  const end = (kind: OneTimeTokenKind, target: LinkTarget, transaction?: Transaction) =>
    OneTimeToken.update(
      { usedAt: now() },
      { where: { kind, usedAt: null, ...target }, transaction },
    );

  /** What a link is for, without using it. Throws `gone`: never made, used and run out look alike. */
  async function look(
    kind: OneTimeTokenKind,
    token: string,
    transaction?: Transaction,
  ): Promise<OneTimeTokenModel> {
    const kept = await OneTimeToken.findOne({
      where: { kind, tokenHash: hashToken(token) },
      transaction,
      ...(transaction && { lock: transaction.LOCK.UPDATE }),
    });
    if (!kept || kept.usedAt || kept.expiresAt <= now())
      throw gone('This link was used already or has run out. Ask for a new one.');
    return kept;
  }

  /** Uses a link up, within the transaction that does what it is for. Throws `gone`. */
  async function take(kind: OneTimeTokenKind, token: string, transaction: Transaction) {
    const kept = await look(kind, token, transaction);
    return kept.update({ usedAt: now() }, { transaction });
  }

  /** Forgets what ran out a month ago. */
  const sweep = () =>
    OneTimeToken.destroy({
      where: { expiresAt: { [Op.lt]: new Date(now().getTime() - 30 * 86_400_000) } },
    });

  return { issue, end, look, take, sweep };
}

export type OneTimeLinks = ReturnType<typeof buildOneTimeLinks>;
