import { commandOf, isAlive, readPid, waitForEnd } from '../processes';
import type { Files } from './files';
import { runSql } from './sql';

/** Asks the server to end and waits until its process is gone; in the end it is killed, which it recovers from. */
export async function shutDown(files: Files): Promise<void> {
  const pid = readPid(files.pid);
  try {
    runSql(files.socket, 'SHUTDOWN');
  } catch {
    // It ended already, or it does not answer: seen below.
  }
  if (pid === null || !isAlive(pid) || !commandOf(pid).includes(files.data)) return;
  if (await waitForEnd(pid, 60)) return;
  process.kill(pid, 'SIGKILL');
  await waitForEnd(pid, 5);
}
