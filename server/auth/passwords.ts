import { hash, verify } from '@node-rs/argon2';

/** `Algorithm.Argon2id` of the package, a const enum that cannot be imported file by file. */
const ARGON2ID = 2;

/** OWASP Password Storage Cheat Sheet, argon2id: m = 19 MiB, t = 2, p = 1, or more. */
const COST = { algorithm: ARGON2ID, memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, COST);

let stranger: Promise<string> | undefined;

/**
 * Does the password fit? For an account that does not exist (`null`) the same work is done and the answer is no, so
 * that the time taken does not tell which accounts exist.
 */
export async function fitsPassword(passwordHash: string | null, password: string) {
  stranger ??= hashPassword('nobody signs in with this');
  const fits = await verify(passwordHash ?? (await stranger), password);
  return passwordHash !== null && fits;
}
