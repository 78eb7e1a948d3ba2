import { existsSync, mkdirSync, readdirSync, renameSync, rmSync, statSync } from 'node:fs';
import path from 'node:path';
import { BootstrapError } from './BootstrapError';
import type { Cleanup } from './cleanup';
import { runQuietly } from './runQuietly';
import { sourceHash } from './sourceHash';

const KEEP_DAYS = 14;
export const EXPO = require.resolve('expo/bin/cli');
/** Nothing is asked of the network, and nothing of the person. */
export const EXPO_QUIET = { EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1', CI: '1' };

/**
 * The client as files, exported anew only where its sources changed: `dist/<hash of the sources>`. A directory of that
 * name is whole and never changes, so that a product that serves an older one is not disturbed.
 */
export async function ensureWebExport(root: string, cleanup: Cleanup): Promise<string> {
  const dist = path.join(root, 'dist');
  const dir = path.join(dist, sourceHash(root));
  if (existsSync(dir)) return dir;
  console.log('Building the client (about a minute, once after each change) …');
  mkdirSync(dist, { recursive: true });
  const unfinished = path.join(dist, `.unfinished-${process.pid}`);
  try {
    const { code, said } = await runQuietly(
      process.execPath,
      [EXPO, 'export', '--platform', 'web', '--output-dir', unfinished],
      { cwd: root, env: { ...process.env, ...EXPO_QUIET, NODE_ENV: 'production' } },
      cleanup,
    );
    if (code !== 0)
      throw new BootstrapError(`The client could not be built:\n${said.trim().slice(-3000)}`);
    // Another process may have been faster with the same sources.
    if (!existsSync(dir)) renameSync(unfinished, dir);
  } finally {
    rmSync(unfinished, { recursive: true, force: true });
  }
  forgetOld(dist, dir);
  return dir;
}

function forgetOld(dist: string, current: string): void {
  for (const name of readdirSync(dist)) {
    const dir = path.join(dist, name);
    const days = (Date.now() - statSync(dir).mtimeMs) / 86_400_000;
    if (dir !== current && days > KEEP_DAYS) rmSync(dir, { recursive: true, force: true });
  }
}
