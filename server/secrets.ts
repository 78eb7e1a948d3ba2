import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** Made at first start, kept in the data directory, readable by its owner alone. */
export interface Secrets {
  /** Signs access tokens. */
  accessTokenKey: string;
  /** Password of the product's own database account. */
  databasePassword: string;
}

const make = (): Secrets => ({
  accessTokenKey: randomBytes(48).toString('base64url'),
  databasePassword: randomBytes(24).toString('base64url'),
});

export function readSecrets(dataDir: string): Secrets {
  const file = path.join(dataDir, 'secrets.json');
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  try {
    // `wx` lets one of two starting processes win; the other reads what it wrote.
    writeFileSync(file, `${JSON.stringify(make(), null, 2)}\n`, { mode: 0o600, flag: 'wx' });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
  }
  const kept = JSON.parse(readFileSync(file, 'utf8')) as Partial<Secrets>;
  if (!kept.accessTokenKey || !kept.databasePassword)
    throw new Error(`${file} is incomplete. Put back its copy, or remove the data directory.`);
  return kept as Secrets;
}
