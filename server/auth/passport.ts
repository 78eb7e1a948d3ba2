import { Passport } from 'passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import type { Platform } from '../platform';
import type { Actor } from '../policies/subject';
import { ALGORITHM, AUDIENCE, type AccessClaims } from './accessTokens';

/** Who is signed in, on which device. */
export interface SignedIn extends Actor {
  family: string;
}

/**
 * A Passport of its own a server. A token holds while its user is active, its version is the user's and its family has
 * a refresh token left: deactivating, signing out and changing roles end it at once, not after ten minutes.
 */
export function buildPassport({ env, models }: Pick<Platform, 'env' | 'models'>) {
  const passport = new Passport();
  passport.use(
    new Strategy(
      {
        jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
        secretOrKey: env.secrets.accessTokenKey,
        algorithms: [ALGORITHM],
        audience: AUDIENCE,
      },
      (claims: AccessClaims, done) => {
        findSignedIn(models, claims).then(
          (signedIn) => done(null, signedIn ?? false),
          (error: unknown) => done(error, false),
        );
      },
    ),
  );
  return passport;
}

async function findSignedIn(
  { User, RefreshToken }: Platform['models'],
  { sub, ver, fam }: AccessClaims,
): Promise<SignedIn | null> {
  const [user, live] = await Promise.all([
    User.findOne({ where: { id: Number(sub), active: true, tokenVersion: ver } }),
    RefreshToken.findOne({
      where: { userId: Number(sub), family: fam, usedAt: null, revokedAt: null },
      attributes: ['id'],
    }),
  ]);
  if (!user || !live) return null;
  return { id: user.id, firmId: user.firmId, roles: user.roles, family: fam };
}
