import jwt from 'jsonwebtoken';

/** Short: what a stolen one is worth. */
export const ACCESS_TOKEN_SECONDS = 600;

export interface AccessClaims {
  /** User id. */
  sub: string;
  /** `token_version` of the user when it was given out. */
  ver: number;
  /** Family of refresh tokens that it belongs to: one signing in on one device. */
  fam: string;
}

export const ALGORITHM = 'HS256';
export const AUDIENCE = 'spate-api';

export const signAccessToken = (claims: AccessClaims, key: string): string =>
  jwt.sign({ ver: claims.ver, fam: claims.fam }, key, {
    algorithm: ALGORITHM,
    audience: AUDIENCE,
    subject: claims.sub,
    expiresIn: ACCESS_TOKEN_SECONDS,
  });
