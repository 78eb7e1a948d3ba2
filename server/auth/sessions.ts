import { randomUUID } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import type { UserModel } from '../models/User';
import type { Platform } from '../platform';
import { unauthenticated } from '../errors';
import { ACCESS_TOKEN_SECONDS, signAccessToken } from './accessTokens';
import { hashToken, makeToken } from './oneWayToken';

export const REFRESH_TOKEN_DAYS = 30;

/** What a device holds after signing in or refreshing. */
export interface Tokens {
  user: UserModel;
  accessToken: string;
  expiresIn: number;
  refreshToken: string;
  refreshExpiresAt: Date;
}

/** Families of refresh tokens: one a signing in on one device. */
export function buildSessions({ env, models, sequelize, now }: Platform) {
  const { RefreshToken, User } = models;

  async function give(user: UserModel, family: string, transaction?: Transaction): Promise<Tokens> {
    const refreshToken = makeToken();
    const refreshExpiresAt = new Date(now().getTime() + REFRESH_TOKEN_DAYS * 86_400_000);
    await RefreshToken.create(
      {
        userId: user.id,
        family,
        tokenHash: hashToken(refreshToken),
        expiresAt: refreshExpiresAt,
      },
      { transaction },
    );
    const claims = { sub: String(user.id), ver: user.tokenVersion, fam: family };
    return {
      user,
      accessToken: signAccessToken(claims, env.secrets.accessTokenKey),
      expiresIn: ACCESS_TOKEN_SECONDS,
      refreshToken,
      refreshExpiresAt,
    };
  }

  /** Signs a user in on one more device. */
  const start = (user: UserModel, transaction?: Transaction) =>
    give(user, randomUUID(), transaction);

  /**
   * Uses a refresh token up and gives its successor. A token that was used before is in two hands: its family ends.
   * Throws `unauthenticated`.
   */
  async function refresh(token: string): Promise<Tokens> {
    const renewed = await sequelize.transaction(async (transaction) => {
      const kept = await RefreshToken.findOne({
        where: { tokenHash: hashToken(token) },
        lock: transaction.LOCK.UPDATE,
        transaction,
      });
      if (!kept || kept.revokedAt || kept.expiresAt <= now()) return null;
      if (kept.usedAt) {
        await endFamily(kept.family, transaction);
        return null;
      }
      const user = await User.findByPk(kept.userId, { include: 'firm', transaction });
      if (!user?.active) return null;
      await kept.update({ usedAt: now() }, { transaction });
      return give(user, kept.family, transaction);
    });
    if (!renewed) throw unauthenticated();
    return renewed;
  }

  const endFamily = (family: string, transaction?: Transaction) =>
    RefreshToken.update({ revokedAt: now() }, { where: { family, revokedAt: null }, transaction });

  /** Ends the family that a refresh token belongs to; an unknown token ends nothing. */
  async function end(token: string): Promise<void> {
    const kept = await RefreshToken.findOne({ where: { tokenHash: hashToken(token) } });
    if (kept) await endFamily(kept.family);
  }

  /** Ends every family of a user, or all but one. Access tokens end with them. */
  const endAll = (userId: number, transaction?: Transaction, exceptFamily?: string) =>
    RefreshToken.update(
      { revokedAt: now() },
      {
        where: {
          userId,
          revokedAt: null,
          ...(exceptFamily && { family: { [Op.ne]: exceptFamily } }),
        },
        transaction,
      },
    );

  /** Forgets what has run out; called now and then. */
  const sweep = () => RefreshToken.destroy({ where: { expiresAt: { [Op.lt]: now() } } });

  return { start, refresh, end, endAll, sweep };
}

export type Sessions = ReturnType<typeof buildSessions>;
