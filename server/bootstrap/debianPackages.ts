import { spawnSync } from 'node:child_process';
import { existsSync, rmSync, writeFileSync } from 'node:fs';
import { BootstrapError } from './BootstrapError';
import { findProgram } from './mariadb/program';

/** The program that shows that a package is there. */
const PROGRAMS = {
  'mariadb-server': 'mariadbd',
  chromium: 'chromium',
  'poppler-utils': 'pdftotext',
} as const;
export type DebianPackage = keyof typeof PROGRAMS;

const POLICY = '/usr/sbin/policy-rc.d';

export const missingPackages = (
  wanted: DebianPackage[],
  find: (program: string) => string | null = findProgram,
): DebianPackage[] => wanted.filter((name) => find(PROGRAMS[name]) === null);

/** What to do about them. Pure. */
export function decidePackages(
  missing: DebianPackage[],
  { isRoot, hasApt }: { isRoot: boolean; hasApt: boolean },
): 'nothing' | 'install' | { message: string } {
  if (missing.length === 0) return 'nothing';
  const names = missing.join(' ');
  if (!hasApt)
    return { message: `Missing: ${names}. Install them with this system's package manager.` };
  if (!isRoot)
    return {
      message: `Missing: ${names}. Install them as root, then start again:\n  apt-get update && apt-get install --no-install-recommends ${names}`,
    };
  return 'install';
}

/** Installs what is missing of Debian's packages; says what to install where it may not. */
export function ensureDebianPackages(wanted: DebianPackage[]): void {
  const missing = missingPackages(wanted);
  const decision = decidePackages(missing, {
    isRoot: process.getuid?.() === 0,
    hasApt: findProgram('apt-get') !== null,
  });
  if (decision === 'nothing') return;
  if (decision !== 'install') throw new BootstrapError(decision.message);
  console.log(`Installing ${missing.join(', ')} from Debian …`);
  withoutStartingServices(() => {
    apt(['update', '-qq']);
    apt(['install', '-y', '-qq', '--no-install-recommends', ...missing]);
  });
  // The product runs a server of its own: the system's shall not start with the machine because of us.
  if (missing.includes('mariadb-server') && existsSync('/run/systemd/system'))
    spawnSync('systemctl', ['disable', '--quiet', 'mariadb'], { stdio: 'ignore' });
}

function apt(args: string[]): void {
  const done = spawnSync('apt-get', args, {
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C' },
    encoding: 'utf8',
  });
  if (done.status === 0) return;
  const said = `${done.stdout}${done.stderr}`.trim().split('\n').slice(-8).join('\n');
  throw new BootstrapError(`apt-get ${args[0]} failed:\n${said}`);
}

/** Debian asks this file whether a service may be started by an installation; 101 is no (policy-rc.d of invoke-rc.d). */
function withoutStartingServices(install: () => void): void {
  if (existsSync(POLICY)) return install();
  writeFileSync(POLICY, '#!/bin/sh\nexit 101\n', { mode: 0o755 });
  try {
    install();
  } finally {
    rmSync(POLICY, { force: true });
  }
}
