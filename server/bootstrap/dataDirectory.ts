import { existsSync, mkdirSync, readFileSync, rmSync, statfsSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { BootstrapError } from './BootstrapError';
import { isAlive } from './processes';

const MB = 1024 * 1024;
/** A new database takes about 120 MB; a grown one needs room to work in. */
const NEEDED_NEW = 300 * MB;
const NEEDED = 64 * MB;

/** Throws where there is too little room to begin. Pure. */
export function checkRoom(dir: string, freeBytes: number, isNew: boolean): void {
  const needed = isNew ? NEEDED_NEW : NEEDED;
  if (freeBytes < needed)
    throw new BootstrapError(
      `The disk is full: ${dir} needs ${needed / MB} MB free, and has ${Math.floor(freeBytes / MB)} MB. Make room, or name another data directory in DATA_DIR.`,
    );
}

/** Tells a process from a later one of the same number: when it was started, of proc(5); empty elsewhere. */
function startOf(pid: number): string {
  try {
    const text = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return text.slice(text.lastIndexOf(')') + 2).split(' ')[19] ?? '';
  } catch {
    return '';
  }
}

/**
 * Makes the data directory and claims it for this process; a claim of a process that is gone is taken over. Answers what
 * gives it up again. Throws `BootstrapError` where the product runs on it already or there is no room.
 */
export function claimDataDirectory(dir: string): () => void {
  const isNew = !existsSync(path.join(dir, 'mysql'));
  mkdirSync(dir, { recursive: true, mode: 0o700 });
  const { bavail, bsize } = statfsSync(dir);
  checkRoom(dir, bavail * bsize, isNew);

  const claim = path.join(dir, 'spate.pid');
  const mine = `${process.pid} ${startOf(process.pid)}\n`;
  for (let attempt = 0; attempt < 2; attempt++) {
    try {
      writeFileSync(claim, mine, { flag: 'wx', mode: 0o600 });
      return () => {
        if (readClaim(claim) === mine) rmSync(claim, { force: true });
      };
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
      const [pid = 0, start = ''] = readClaim(claim).trim().split(' ');
      if (Number(pid) > 0 && isAlive(Number(pid)) && startOf(Number(pid)) === start)
        throw new BootstrapError(
          `Spate runs on ${dir} already (process ${pid}). Stop it, or name another data directory in DATA_DIR.`,
        );
      rmSync(claim, { force: true });
    }
  }
  throw new BootstrapError(`Another Spate is starting on ${dir} at this moment.`);
}

function readClaim(file: string): string {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return '';
  }
}
