import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

/** What the client is made of. */
const SOURCES = [
  'app',
  'components',
  'shared',
  'assets',
  'public',
  'server/solvers',
  'app.json',
  'babel.config.js',
  'metro.config.js',
  'tsconfig.json',
  'package-lock.json',
];

/** A name for a state of files and directories: their paths and contents, nothing else. */
export function sourceHash(root: string, sources: string[] = SOURCES): string {
  const hash = createHash('sha256');
  const add = (name: string) => {
    const file = path.join(root, name);
    const stat = statSync(file, { throwIfNoEntry: false });
    if (!stat) return;
    if (stat.isDirectory()) {
      for (const inner of readdirSync(file).sort()) add(`${name}/${inner}`);
    } else {
      hash.update(`${name}\0${stat.size}\0`).update(readFileSync(file));
    }
  };
  for (const source of sources) add(source);
  return hash.digest('hex').slice(0, 16);
}
