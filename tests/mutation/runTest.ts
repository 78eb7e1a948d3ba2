import { execFile } from 'node:child_process';
import path from 'node:path';

/** A mutant that runs in circles is as good as seen. */
const MOST_MILLISECONDS = 300_000;

/** Runs one file of the solver's tests in a tree; returns the name of a test that failed, null where all pass. */
export function failureOf(root: string, test: string): Promise<string | null> {
  const jest = path.join(root, 'node_modules/jest/bin/jest.js');
  const file = path.join(root, 'tests/solvers', `${test}.test.ts`);
  const args = [jest, '--runInBand', '--ci', '--runTestsByPath', file];
  const options = { cwd: root, timeout: MOST_MILLISECONDS, maxBuffer: 1e9 };
  return new Promise((resolve, reject) => {
    execFile(process.execPath, args, options, (error, _stdout, stderr) => {
      const named = /^ +● (?!Console)(.+)$/m.exec(stderr)?.[1];
      if (error === null) resolve(null);
      else if (error.killed) resolve('does not come to an end');
      else if (named) resolve(named);
      else reject(new Error(`jest did not run ${test}: ${stderr.slice(-600)}`));
    });
  });
}
