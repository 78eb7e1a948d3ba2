import { createHash, randomBytes } from 'node:crypto';

/** A token of 256 random bits for cookies and links. */
export const makeToken = (): string => randomBytes(32).toString('base64url');

/** What is stored of it. Random tokens need no slow hash. */
export const hashToken = (token: string): string =>
  createHash('sha256').update(token).digest('hex');
