import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

const ROOT = path.resolve(__dirname, '../..');

/** A directory for a product, with a page in the place of the client. */
export function makeProductDir(): { dir: string; web: string; remove: () => void } {
  const dir = mkdtempSync(path.join(os.tmpdir(), 'spate-start-'));
  const web = mkdtempSync(path.join(os.tmpdir(), 'spate-web-'));
  writeFileSync(path.join(web, 'index.html'), '<title>Spate</title>');
  return {
    dir,
    web,
    remove: () => {
      for (const pid of databasesOn(dir)) process.kill(pid, 'SIGKILL');
      for (const made of [dir, web]) rmSync(made, { recursive: true, force: true, maxRetries: 5 });
    },
  };
}

/** So that a test that failed leaves nothing behind. */
const running = new Set<ChildProcess>();
export const killProducts = (): void => running.forEach((child) => child.kill('SIGKILL'));

export interface Product {
  process: ChildProcess;
  said: () => string;
  /** Exit code, once it has ended. */
  ended: Promise<number | null>;
  /** Resolves when it serves, rejects when it ends before. */
  serving: Promise<void>;
  /** What it said when it ended with 1; rejects when it serves all the same. */
  refused: () => Promise<string>;
}

/** `npm start` as a process of its own. */
export function startProduct(settings: Record<string, string>): Product {
  const child = spawn(process.execPath, ['server/bootstrap/start.js'], {
    cwd: ROOT,
    env: { PATH: process.env.PATH, HOME: process.env.HOME, DEMO_DATA: 'no', ...settings },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  running.add(child);
  child.once('exit', () => running.delete(child));
  let said = '';
  const ended = new Promise<number | null>((resolve) => child.once('close', resolve));
  const serving = new Promise<void>((resolve, reject) => {
    const hear = (part: Buffer) => {
      said += part.toString();
      if (said.includes('Spate serves on')) resolve();
    };
    child.stdout.on('data', hear);
    child.stderr.on('data', hear);
    void ended.then((code) => reject(new Error(`It ended with ${code}:\n${said}`)));
  });
  // Tests of refusals never wait for it.
  serving.catch(() => undefined);
  const refused = async () => {
    const code = await Promise.race([
      ended,
      serving.then(
        () => 'it serves',
        () => ended,
      ),
    ]);
    if (code !== 1) throw new Error(`Not refused (${code}):\n${said}`);
    return said;
  };
  return { process: child, said: () => said, ended, serving, refused };
}

/** Process numbers of database servers that work in a directory. */
export const databasesOn = (dir: string): number[] =>
  readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .filter((pid) => commandLine(pid).includes(`--datadir=${dir}/`))
    .map(Number);

function commandLine(pid: string): string {
  try {
    const line = readFileSync(`/proc/${pid}/cmdline`, 'utf8');
    return line.includes('mariadbd') ? line : '';
  } catch {
    return '';
  }
}
