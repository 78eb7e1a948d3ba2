import { spawn, type SpawnOptions } from 'node:child_process';
import type { Cleanup } from './cleanup';

/** Runs a program and keeps what it says; it is ended when we are. */
export function runQuietly(
  program: string,
  args: string[],
  options: SpawnOptions,
  cleanup: Cleanup,
): Promise<{ code: number | null; said: string }> {
  const child = spawn(program, args, { ...options, stdio: ['ignore', 'pipe', 'pipe'] });
  cleanup.add(() => void child.kill('SIGKILL'));
  let said = '';
  child.stdout?.on('data', (part: Buffer) => (said += part.toString()));
  child.stderr?.on('data', (part: Buffer) => (said += part.toString()));
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('close', (code) => resolve({ code, said }));
  });
}
