import { readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

/** Is there a process of this number? One that belongs to somebody else counts, one that ended and was not collected does not. */
export function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0);
  } catch (error) {
    return (error as NodeJS.ErrnoException).code === 'EPERM';
  }
  return stateOf(pid) !== 'Z';
}

/** One letter of proc(5); null where it cannot be told. */
function stateOf(pid: number): string | null {
  try {
    return /\) (\S)/.exec(readFileSync(`/proc/${pid}/stat`, 'utf8'))?.[1] ?? null;
  } catch {
    return null;
  }
}

/** Command line, arguments set apart by spaces; empty where it cannot be read. */
export function commandOf(pid: number): string {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim();
  } catch {
    return '';
  }
}

/** Number in a file; null where there is none. */
export function readPid(file: string): number | null {
  try {
    const pid = Number(readFileSync(file, 'utf8').trim().split(/\s/)[0]);
    return Number.isInteger(pid) && pid > 0 ? pid : null;
  } catch {
    return null;
  }
}

/** Waits until a process is gone; false when the time is up. */
export async function waitForEnd(pid: number, seconds: number): Promise<boolean> {
  const end = Date.now() + seconds * 1000;
  while (isAlive(pid)) {
    if (Date.now() > end) return false;
    await sleep(50);
  }
  return true;
}
