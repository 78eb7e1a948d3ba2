import { createHash } from 'node:crypto';
import { lstatSync, mkdirSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { BootstrapError } from '../BootstrapError';

/** `sun_path` of unix(7) has 108 bytes, the last of them zero. */
const LONGEST = 107;

/**
 * Where the database's socket lies: in its own directory, or for one with a long path in a private directory of the
 * system's temporary ones whose name follows from it, so that a later start finds it again.
 */
export function socketPath(dir: string): string {
  const near = path.join(dir, 'mysql.sock');
  if (Buffer.byteLength(near) <= LONGEST) return near;
  const name = createHash('sha256').update(dir).digest('hex').slice(0, 16);
  const short = path.join(os.tmpdir(), `spate-${name}`);
  mkdirSync(short, { recursive: true, mode: 0o700 });
  const { uid, mode } = lstatSync(short);
  if (uid !== process.getuid?.() || (mode & 0o077) !== 0)
    throw new BootstrapError(
      `${short} belongs to somebody else. Remove it, or use a data directory with a shorter path (DATA_DIR).`,
    );
  return path.join(short, 'mysql.sock');
}
