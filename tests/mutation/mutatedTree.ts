import { execFileSync } from 'node:child_process';
import { cpSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { Mutation } from './mutation';

const ROOT = path.join(__dirname, '../..');
const COPIED = ['server', 'shared', 'seed', 'tests', 'package.json', 'tsconfig.server.json'];
const RUNS_FAST = 'fast/runsFast.ts';

/** The tests of the solver alone, with time enough on a busy machine. */
const JEST_CONFIG = `const [solvers] = require(${JSON.stringify(path.join(ROOT, 'jest.config.js'))}).projects;
module.exports = { ...solvers, rootDir: __dirname, testTimeout: 120000 };
`;

/** A copy of the tree to spoil: the readable kernel runs in it. */
export interface MutatedTree {
  root: string;
  apply(mutation: Mutation): void;
  revert(mutation: Mutation): void;
  remove(): void;
}

/** The text of a file with a mutation; throws where what it changes does not stand there exactly once. */
export function mutated(text: string, { file, find, put }: Mutation): string {
  const pieces = text.split(find);
  if (pieces.length !== 2) {
    throw new Error(`${file}: "${find}" stands there ${pieces.length - 1} times, not once`);
  }
  return pieces.join(put);
}

export function originalText(file: string): string {
  return readFileSync(path.join(ROOT, 'server/solvers', file), 'utf8');
}

export function createMutatedTree(): MutatedTree {
  const root = mkdtempSync(path.join(tmpdir(), 'spate-mutants-'));
  const solver = path.join(root, 'server/solvers');
  for (const name of COPIED) {
    cpSync(path.join(ROOT, name), path.join(root, name), { recursive: true });
  }
  symlinkSync(path.join(ROOT, 'node_modules'), path.join(root, 'node_modules'));
  writeFileSync(path.join(root, 'jest.config.js'), JEST_CONFIG);
  const put = (file: string, text: string): void => writeFileSync(path.join(solver, file), text);
  const kept = (file: string): string => readFileSync(path.join(solver, file), 'utf8');
  const runsFast = kept(RUNS_FAST);
  const isReadable = runsFast.replace(/return .*;/, 'return false;');
  const bytes = kept('fast/kernelBytes.ts');
  const originals = new Map<string, string>();
  put(RUNS_FAST, isReadable);

  return {
    root,
    apply(mutation) {
      const original = originals.get(mutation.file) ?? kept(mutation.file);
      originals.set(mutation.file, original);
      put(mutation.file, mutated(original, mutation));
      if (!mutation.isFast) return;
      put(RUNS_FAST, runsFast);
      execFileSync('npx', ['tsx', 'server/solvers/fast/buildKernel.ts'], { cwd: root });
    },
    revert({ file, isFast }) {
      const original = originals.get(file);
      if (original !== undefined) put(file, original);
      if (!isFast) return;
      put(RUNS_FAST, isReadable);
      put('fast/kernelBytes.ts', bytes);
    },
    remove: () => rmSync(root, { recursive: true }),
  };
}
