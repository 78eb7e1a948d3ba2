import { spawn } from 'node:child_process';
import { closeSync, openSync, readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';
import { BootstrapError } from '../BootstrapError';
import { freePort } from '../freePort';
import { asRoot, type Files } from './files';
import { program } from './program';
import { runSql } from './sql';

const START_SECONDS = 120;

/** Starts the server and waits until it answers; its port on loopback. */
export async function launch(files: Files, args: string[]): Promise<number> {
  const port = await freePort();
  const log = openSync(files.log, 'w');
  // In a session of its own: Ctrl-C in the terminal is for us, and we stop the server when we are done with it.
  const server = spawn(
    program('mariadbd'),
    [
      '--no-defaults',
      ...asRoot(),
      `--datadir=${files.data}`,
      `--socket=${files.socket}`,
      `--pid-file=${files.pid}`,
      `--tmpdir=${files.tmp}`,
      `--port=${port}`,
      '--bind-address=127.0.0.1',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--max-allowed-packet=64M',
      '--skip-name-resolve',
      '--skip-log-bin',
      ...args,
    ],
    { detached: true, stdio: ['ignore', log, log] },
  );
  closeSync(log);
  server.unref();
  const end = Date.now() + START_SECONDS * 1000;
  while (server.exitCode === null && server.signalCode === null && Date.now() < end) {
    try {
      runSql(files.socket, 'SELECT 1');
      return port;
    } catch {
      await sleep(100);
    }
  }
  server.kill('SIGKILL');
  throw new BootstrapError(
    `The database did not start. ${reason(readFileSync(files.log, 'utf8'))}`,
  );
}

/** What the server's log says of its end, in words where we know them. */
export function reason(log: string): string {
  if (/No space left on device|Errcode: 28|error number 28/i.test(log))
    return 'The disk is full: make room and start again.';
  if (/Permission denied|Errcode: 13/i.test(log))
    return 'Its files may not be written: give them to the user who starts Spate, or use another data directory (DATA_DIR).';
  if (/Unable to lock|Can't lock aria|errno: 11/i.test(log))
    return 'Another database server works on the same data directory. Stop it first.';
  const errors = log.split('\n').filter((line) => line.includes('[ERROR]'));
  return `It said:\n${errors.slice(-5).join('\n') || log.trim().slice(-500)}`;
}
