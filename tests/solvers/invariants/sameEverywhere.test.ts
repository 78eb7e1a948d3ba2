import { execFileSync } from 'node:child_process';
import path from 'node:path';
import { Worker } from 'node:worker_threads';
import type { CaseFile } from '@/shared/case/caseFile';
import type { ResultFile } from '@/shared/case/resultFile';
import { buildCase } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** A flood over bank, a tributary and a falling outlet: every part of the solver takes its share. */
const flood: CaseFile = buildCase({
  sections: naturalReach(3, { length: 4000, spacing: 200, slope: 0.001 }),
  upstream: { kind: 'inflow', times: [0, 1200, 4800], flows: [20, 400, 30] },
  downstream: { kind: 'normalDepth', slope: 0.001 },
  laterals: [{ from: 1500, to: 1900, times: [0, 1800], flows: [1, 25] }],
  initial: { kind: 'steady' },
  numerics: { cellSize: 25, duration: 5400, outputInterval: 300 },
});

/** The time that computing took is the only field that may differ. */
const comparable = (result: ResultFile) => JSON.stringify({ ...result, seconds: 0 });

function routeInWorker(caseFile: CaseFile): Promise<string> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(path.join(__dirname, '../../helpers/solvers/routeWorker.ts'), {
      workerData: caseFile,
      execArgv: ['--require', 'tsx/cjs'],
    });
    worker.once('message', resolve);
    worker.once('error', reject);
  });
}

describe('one case, one result', () => {
  const here = comparable(routeChecked(flood));

  it('is the same to the bit when routed again and when watched', () => {
    let outputs = 0;
    const watched = routeChecked(flood, {
      onOutput: () => outputs++,
      onProgress: () => undefined,
      shouldStop: () => false,
    });
    expect(comparable(watched)).toBe(here);
    expect(outputs).toBe(watched.times.length);
  });

  it('is the same in a worker thread', async () => {
    expect(comparable(JSON.parse(await routeInWorker(flood)))).toBe(here);
  }, 60_000);

  it('is the same from the command line', () => {
    const output = execFileSync('npm', ['run', '--silent', 'route', '--', '-'], {
      input: JSON.stringify(flood),
      encoding: 'utf8',
      maxBuffer: 64 * 1024 * 1024,
      stdio: ['pipe', 'pipe', 'ignore'],
    });
    expect(comparable(JSON.parse(output))).toBe(here);
  }, 60_000);
});
