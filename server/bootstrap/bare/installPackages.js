const { spawnSync } = require('node:child_process');
const { createHash } = require('node:crypto');
const fs = require('node:fs');
const path = require('node:path');

/** Tells which package-lock.json the installed packages are of. */
const STAMP = '.spate-lock-hash';

/**
 * Does npm's own record of what is installed (`node_modules/.package-lock.json`) hold what the lock file asks for?
 * Optional packages are of other systems.
 */
function matches(lock, installed) {
  return Object.entries(lock.packages).every(([name, { version, optional }]) => {
    if (name === '') return true;
    const found = installed.packages[name];
    return found ? found.version === version : optional === true;
  });
}

/** `nothing`, or `stamp` where the packages are right but were installed by hand, or `install`. Pure. */
function decideInstall({ lockHash, stamp, lock, installed }) {
  if (installed === null) return 'install';
  if (stamp === lockHash) return 'nothing';
  return matches(lock, installed) ? 'stamp' : 'install';
}

const readOr = (file, otherwise) => {
  try {
    return fs.readFileSync(file, 'utf8');
  } catch {
    return otherwise;
  }
};

/** Runs `npm ci` where packages are missing or of another lock file. Throws with npm's last words. */
function installPackages(root) {
  const modules = path.join(root, 'node_modules');
  const stampFile = path.join(modules, STAMP);
  const lockText = fs.readFileSync(path.join(root, 'package-lock.json'), 'utf8');
  const lockHash = createHash('sha256').update(lockText).digest('hex');
  const record = readOr(path.join(modules, '.package-lock.json'), null);
  const decision = decideInstall({
    lockHash,
    stamp: readOr(stampFile, null),
    lock: JSON.parse(lockText),
    installed: record && JSON.parse(record),
  });
  if (decision === 'nothing') return;
  if (decision === 'install') {
    console.log('Installing packages (about a minute, once) …');
    const npm = process.env.npm_execpath
      ? [process.execPath, [process.env.npm_execpath]]
      : ['npm', []];
    const args = [...npm[1], 'ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
    const done = spawnSync(npm[0], args, { cwd: root, stdio: ['ignore', 'inherit', 'inherit'] });
    if (done.error?.code === 'ENOENT')
      throw new Error('npm is missing: it comes with Node. Install it and start again.');
    if (done.status !== 0)
      throw new Error(
        'The packages could not be installed; npm says above why. Check the connection and the free space, and start again.',
      );
  }
  fs.writeFileSync(stampFile, lockHash);
}

module.exports = { decideInstall, installPackages, matches };
