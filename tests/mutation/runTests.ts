import { execFile } from 'node:child_process';
import path from 'node:path';

/** A mutant that runs in circles is as good as seen. */
const MOST_MILLISECONDS = 300_000;

/** Runs tests of the solver in a tree; returns the name of the first that failed, null where all pass. */
export function firstFailure(root: string, tests: readonly string[]): Promise<string | null> {
  const jest = path.join(root, 'node_modules/jest/bin/jest.js');
  const files = tests.map((name) => path.join(root, 'tests/solvers', `${name}.test.ts`));
  const args = [jest, '--runInBand', '--bail=1', '--ci', '--runTestsByPath', ...files];
  const options = { cwd: root, timeout: MOST_MILLISECONDS, maxBuffer: 1e9 };
  return new Promise((resolve) => {
    execFile(process.execPath, args, options, (error, stdout, stderr) => {
      if (error === null) resolve(null);
      else if (error.killed) resolve('does not come to an end');
      else resolve(/^ +● (?!Console)(.+)$/m.exec(stderr)?.[1] ?? `jest: ${stderr.slice(-400)}`);
    });
  });
}
